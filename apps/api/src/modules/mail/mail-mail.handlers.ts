import { Order } from '#api/db/models/order.ts';
import { SentMail } from '#api/db/models/sent-mail.ts';
import { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { renderMail } from '#api/mail/render-mail.ts';
import { mailTemplate } from '#api/mail/words.ts';
import type { EventHandlers } from '#api/outbox/events.ts';
import { loadHouse } from './house.queries.ts';
import type { MailDeps } from './mail-handlers.ts';
import { queueMail } from './queue-mail.command.ts';

type MailMailHandlers = Pick<EventHandlers, 'mail-given-up' | 'mail-to-send-again'>;

/** Mails about mails. */
export function mailMailHandlers(deps: MailDeps): MailMailHandlers {
  return {
    async 'mail-given-up'({ sentMailId }, { outboxId, uniqueKey }) {
      const lost = await SentMail.findByPk(sentMailId, {
        rejectOnEmpty: true,
        include: [{ model: Order, as: 'order' }],
      });
      if (lost.erasedAt !== null) return;
      const house = await loadHouse(deps);
      const data = {
        subject: lost.subject,
        to: lost.toAddress,
        reason: lost.lastError ?? '',
        orderNumber: lost.order?.number ?? null,
        link: `${deps.env.publicUrl}/staff/mail/${lost.id}`,
      };
      const rendered = renderMail('mail-given-up', data, house);
      const recipients = await ownersBut(lost.toAddress, house.studio.email);
      await inTransaction(async () => {
        for (const to of recipients) {
          await queueMail(deps, {
            template: 'mail-given-up',
            rendered,
            to,
            replyTo: null,
            outboxId,
            uniqueKey: `${uniqueKey}:${to}`,
          });
        }
      });
    },

    async 'mail-to-send-again'({ sentMailId }, { outboxId, uniqueKey }) {
      const mail = await SentMail.findByPk(sentMailId, { rejectOnEmpty: true });
      if (mail.erasedAt !== null) return;
      const { subject, html, text, toAddress, replyTo, attachments, orderId, userId } = mail;
      await queueMail(deps, {
        template: mailTemplate.parse(mail.template),
        rendered: { subject, html, text },
        to: toAddress,
        replyTo,
        attachments,
        outboxId,
        uniqueKey,
        orderId: orderId ?? undefined,
        userId,
        resendOfId: mail.id,
      });
    },
  };
}

/**
 * The owners' own addresses, since the studio's may be the one that fails. The address that failed
 * is left out unless there is no other.
 */
async function ownersBut(failed: string, studioEmail: string): Promise<string[]> {
  const owners = await User.findAll({ where: { role: 'owner', endedAt: null, erasedAt: null } });
  const addresses = owners.flatMap(({ email }) => email ?? []);
  const others = addresses.filter((address) => address !== failed);
  if (others.length > 0) return others;
  return [studioEmail];
}
