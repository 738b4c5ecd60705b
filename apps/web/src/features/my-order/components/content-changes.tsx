import type { OrderView } from '#shared/contracts/orders.ts';
import type { StudioCard } from '#shared/contracts/menu.ts';
import { instantWords } from '#web/components/order/order-times.ts';
import { Notice } from '#web/components/ui/notice.tsx';

type Props = { readonly order: OrderView; readonly studio: StudioCard };

/** What is in the cake now and was not when it was ordered; nothing about who eats it. */
export function ContentChanges({ order, studio }: Props) {
  const { contentChanges, pickup } = order;
  if (contentChanges.length === 0) return null;
  return (
    <Notice tone="butter" title="Something in your cake has changed" className="lg:col-span-2">
      <ul className="grid gap-1">
        {contentChanges.toReversed().map(({ id, at, changes }) =>
          changes.map((each) => (
            <li key={`${id} ${each}`}>
              {each}{' '}
              <span className="text-sm text-slate">
                ({instantWords(at, pickup.zone, studio.locale)})
              </span>
            </li>
          )),
        )}
      </ul>
      <p>
        Please tell whoever at your table it matters to. If it does not suit somebody, write to us
        below or ring {studio.phone}: we look for a way with you. Ask a doctor what is right for
        somebody with an allergy.
      </p>
    </Notice>
  );
}
