import { SentMail } from '#api/db/models/sent-mail.ts';
import { afterCommit, inTransaction } from '#api/db/transaction.ts';
import type { MailAttachment } from '#api/db/json-shapes.ts';
import type { RenderedMail } from '#api/mail/render-mail.ts';
import type { MailTemplate } from '#api/mail/mail-data.ts';
import type { Deps } from '#api/modules/deps.ts';
import { mailSignal } from '#api/outbox/signal.ts';
import { newId } from '#api/platform/ids.ts';

export type MailToQueue = {
  readonly template: MailTemplate;
  readonly rendered: RenderedMail;
  readonly to: string;
  readonly replyTo: string | null;
  readonly attachments?: readonly MailAttachment[];
  /** Names this one mail: queued again under the same key, nothing is added. */
  readonly uniqueKey: string;
  readonly outboxId: number;
  readonly orderId?: string;
  readonly userId?: string | null;
  /** Its link; once that is spent the mail is not sent any more. */
  readonly tokenId?: string;
  readonly resendOfId?: number;
};

/**
 * Keeps a rendered mail with its Message-ID, to be sent as it is from then on. Mails about one
 * order to one address answer one another, so that mail programs show them together.
 */
export async function queueMail(
  { clock, env }: Pick<Deps, 'clock' | 'env'>,
  mail: MailToQueue,
): Promise<void> {
  const { rendered, attachments, to, ...rest } = mail;
  await inTransaction(async () => {
    if ((await SentMail.findOne({ where: { uniqueKey: mail.uniqueKey } })) !== null) return;
    await SentMail.create({
      ...rest,
      ...rendered,
      ...(await threadOf(mail)),
      toAddress: to,
      fromAddress: env.mailFrom,
      attachments: [...(attachments ?? [])],
      messageId: `<${newId()}@${domainOf(env.mailFrom)}>`,
      nextAt: clock.now(),
    });
    afterCommit(() => mailSignal.notify());
  });
}

/** References name the first mail and the last few before this one, the latest at the end. */
const referencesKept = 10;

async function threadOf({
  orderId,
  to,
}: MailToQueue): Promise<{ inReplyTo?: string; threadReferences?: string }> {
  if (orderId === undefined) return {};
  const earlier = await SentMail.findAll({
    attributes: ['messageId'],
    where: { orderId, toAddress: to },
    order: [['id', 'ASC']],
  });
  const ids = earlier.map(({ messageId }) => messageId);
  const kept = ids.length <= referencesKept ? ids : [...ids.slice(0, 1), ...ids.slice(-9)];
  return { inReplyTo: ids.at(-1), threadReferences: kept.join(' ') };
}

/** The domain of `Name <address>` or an address. */
function domainOf(sender: string): string {
  return sender.replace(/^.*@/, '').replace(/>$/, '');
}
