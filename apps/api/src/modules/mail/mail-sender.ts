import type { SmtpAnswer, SmtpClient, SmtpMessage } from '#api/clients/smtp.ts';
import { MailAttempt } from '#api/db/models/mail-attempt.ts';
import { SentMail } from '#api/db/models/sent-mail.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { enqueue } from '#api/outbox/enqueue.ts';
import { LeaseQueue } from '#api/outbox/lease.ts';
import type { Lease } from '#api/outbox/lease.ts';
import { createLoop } from '#api/outbox/loop.ts';
import type { Loop } from '#api/outbox/loop.ts';
import { maxAttempts } from '#api/outbox/retry-plan.ts';
import { mailSignal } from '#api/outbox/signal.ts';
import { withoutAddresses } from '#api/platform/logger.ts';
import { withoutKeys } from './link-keys.ts';
import { whyStale } from './stale-mail.queries.ts';

export type MailSender = Loop & {
  /** Tries every mail that is due now and answers how many there were. For tests. */
  runOnce(): Promise<number>;
};

export type MailSenderOptions = Pick<Deps, 'clock' | 'logger'> & {
  readonly smtp: SmtpClient;
  /** Tells this process from other workers on the same file. */
  readonly worker: string;
  readonly random?: () => number;
};

/** How what became of a mail ends up in its row. */
type Ending = 'sent' | 'again-later' | 'given-up' | 'dropped' | 'lost';

/** Longest reply kept with an attempt, characters. */
const responseLength = 500;

/**
 * Sends kept mails one after the other, each until the mail server has taken it, has refused it
 * for good (5xx), or about two days have passed; then it stays as given up, and the owners are told.
 *
 * None is lost: a mail is a row before it is sent, and leaves the queue in the transaction that
 * notes the server's answer. One may come twice: when we are killed (or the line is cut) between
 * the server's yes and our note of it, the row is still queued and the same bytes are sent again,
 * with the same Message-ID, by which mail programs know a copy.
 */
export function createMailSender(options: MailSenderOptions): MailSender {
  const { clock, logger, smtp, worker, random } = options;
  const queue = new LeaseQueue({ table: 'sent_mail', clock, worker, random });

  const next = async (): Promise<boolean> => {
    const lease = await queue.take();
    if (lease === null) return false;
    const mail = await SentMail.findByPk(lease.id, { rejectOnEmpty: true });
    const ending = await handle(mail, lease);
    const about = { mailId: mail.id, template: mail.template, attempt: lease.attempt, ending };
    if (ending === 'given-up') logger.error(about, 'a mail was given up');
    else if (ending === 'sent') logger.info(about, 'a mail was sent');
    else logger.warn(about, 'a mail was not sent');
    return true;
  };

  const handle = async (mail: SentMail, lease: Lease): Promise<Ending> => {
    if (lease.attempt > maxAttempts) {
      return giveUp(mail, lease, 'The program ended during every attempt.');
    }
    const stale = await whyStale(mail, clock.now());
    if (stale !== null) {
      return inTransaction(async () => {
        const ours = await queue.abandon(lease, 'dropped', stale);
        if (ours) await forgetKeys(mail);
        return ours ? 'dropped' : 'lost';
      });
    }
    const answer = await smtp.send(messageOf(mail));
    return inTransaction(async () => {
      await noteAttempt(mail, answer);
      return settle(mail, lease, answer);
    });
  };

  const settle = async (
    mail: SentMail,
    lease: Lease,
    { outcome, response }: SmtpAnswer,
  ): Promise<Ending> => {
    if (outcome === 'refused') return giveUp(mail, lease, response);
    if (outcome === 'sent') {
      const ours = await queue.finish(lease);
      if (ours) await forgetKeys(mail);
      return ours ? 'sent' : 'lost';
    }
    const postponed = await queue.postpone(lease, response);
    if (postponed === 'given-up') await tellOwners(mail);
    return postponed;
  };

  const giveUp = (mail: SentMail, lease: Lease, reason: string): Promise<Ending> =>
    inTransaction(async () => {
      if (!(await queue.abandon(lease, 'given-up', reason))) return 'lost';
      await tellOwners(mail);
      return 'given-up';
    });

  return {
    ...createLoop({ name: 'mail', next, signal: mailSignal, logger }),
    async runOnce() {
      let tried = 0;
      while (await next()) tried += 1;
      return tried;
    },
  };
}

/** An alert about mail never alerts about itself: it would go the way of the first. */
async function tellOwners({ id, template }: SentMail): Promise<void> {
  if (template === 'mail-given-up') return;
  await enqueue('mail-given-up', { sentMailId: id }, { uniqueKey: `mail-given-up:${id}` });
}

/** A link that works once is of no use in a row that will not be sent again, but to a thief. */
async function forgetKeys({ id, tokenId, html, text }: SentMail): Promise<void> {
  if (tokenId === null) return;
  const kept = { html: withoutKeys(html), text: withoutKeys(text) };
  await SentMail.update(kept, { where: { id } });
}

async function noteAttempt({ id }: SentMail, { outcome, response }: SmtpAnswer): Promise<void> {
  await MailAttempt.create({
    sentMailId: id,
    outcome,
    response: withoutAddresses(response).slice(0, responseLength),
  });
}

function messageOf(mail: SentMail): SmtpMessage {
  return {
    messageId: mail.messageId,
    date: mail.createdAt,
    from: mail.fromAddress,
    to: mail.toAddress,
    replyTo: mail.replyTo,
    subject: mail.subject,
    html: mail.html,
    text: mail.text,
    inReplyTo: mail.inReplyTo,
    references: mail.threadReferences.split(' ').filter((it) => it !== ''),
    attachments: mail.attachments,
  };
}
