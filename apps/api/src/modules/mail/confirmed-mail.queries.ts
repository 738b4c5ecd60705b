import { Quote } from '#api/db/models/quote.ts';
import type { MailData } from '#api/mail/mail-data.ts';
import { renderMail } from '#api/mail/render-mail.ts';
import type { RenderedMail } from '#api/mail/render-mail.ts';
import { withoutKeys } from './link-keys.ts';
import type { MailDeps } from './mail-handlers.ts';
import { loadToldOrder } from './mail-order.queries.ts';
import type { ToldOrder } from './mail-order.queries.ts';

/** What the confirming mail is made of, the note of the agreed quote included. */
export async function confirmedMail({
  record,
  forCustomer,
}: ToldOrder): Promise<MailData['confirmed']> {
  const quote = await Quote.findOne({
    where: { orderId: record.order.id, state: 'agreed' },
    order: [['n', 'DESC']],
  });
  return { order: forCustomer, note: quote?.note ?? '' };
}

/**
 * The confirming mail as it would go out now, for a last look before confirming; the key of the
 * customer's link is left out.
 */
export async function previewConfirmation(
  deps: Pick<MailDeps, 'env'>,
  orderId: string,
  note: string,
): Promise<RenderedMail & { readonly to: string }> {
  const { email, forCustomer, house } = await loadToldOrder(deps, orderId);
  const rendered = renderMail('confirmed', { order: forCustomer, note }, house);
  return {
    to: email ?? '',
    subject: rendered.subject,
    html: withoutKeys(rendered.html),
    text: withoutKeys(rendered.text),
  };
}
