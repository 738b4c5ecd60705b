import type { OrderView } from '#shared/contracts/orders.ts';
import { Notice } from '#web/components/ui/notice.tsx';
import { instantWords } from '#web/components/order/order-times.ts';

type Props = { readonly order: OrderView; readonly locale: string; readonly answerHours: number };

/** Whether a place in the plan is kept for an order that is not confirmed, and what keeps it. */
export function HoldNotice({ order, locale, answerHours }: Props) {
  const { hold, pickup, status } = order;
  const first =
    order.design.guests.allergies.length > 0 &&
    ' What you told us of allergies is read first, and talked over with you wherever it needs it, before anything is promised.';
  if (hold !== null) {
    const until = instantWords(hold.expiresAt, pickup.zone, locale);
    return hold.needsLink ? (
      <Notice tone="butter" title={`Your place is kept until ${until}`}>
        <p>
          Open the link in the e-mail we have just sent to {order.orderedBy.email}: that keeps it
          until the baker has answered, within {answerHours} hours.{first}
        </p>
      </Notice>
    ) : (
      <Notice tone="butter" title={`Your place is kept until ${until}`}>
        <p>
          The baker looks at your order and answers by e-mail before then. Nothing is to be paid
          yet.{first}
        </p>
      </Notice>
    );
  }
  if (status !== 'asked') return null;
  return (
    <Notice tone="butter" title="No place is kept for this day">
      <p>
        Your order is with the baker, who looks whether the day can be kept and answers by e-mail.
        {first}
      </p>
    </Notice>
  );
}
