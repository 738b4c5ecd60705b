import type { SentMailRow, SentMailView } from '#shared/contracts/staff.ts';
import { SentMail } from '#api/db/models/sent-mail.ts';
import { notFound } from '#api/platform/app-error.ts';
import { withoutKeys } from './link-keys.ts';

/** Everything that was sent about an order, or is on its way, oldest first. */
export async function mailOfOrder(orderId: string): Promise<SentMailRow[]> {
  const mails = await SentMail.findAll({
    attributes: { exclude: ['html', 'text', 'attachments'] },
    where: { orderId },
    order: [['id', 'ASC']],
  });
  return mails.map(presentSentMailRow);
}

/** One mail by the id the contract gives it. @throws `not-found` */
export async function findSentMail(id: string): Promise<SentMail> {
  const mail = /^\d{1,15}$/.test(id) ? await SentMail.findByPk(Number(id)) : null;
  if (mail === null) throw notFound();
  return mail;
}

function presentSentMailRow(mail: SentMail): SentMailRow {
  return {
    id: String(mail.id),
    template: mail.template,
    to: mail.toAddress,
    subject: mail.subject,
    state: mail.state,
    at: (mail.sentAt ?? mail.createdAt).toISOString(),
    attempts: mail.attempts,
    lastError: mail.lastError,
  };
}

/** Exactly what was sent, but for the keys of its links. */
export function presentSentMail(mail: SentMail): SentMailView {
  return {
    ...presentSentMailRow(mail),
    html: withoutKeys(mail.html),
    text: withoutKeys(mail.text),
  };
}
