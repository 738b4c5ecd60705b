import type { Menu } from '#shared/contracts/menu.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { instantWords } from '#web/components/order/order-times.ts';

/** What has happened to the order, newest first, strung on a line. */
export function OrderEvents({ order, menu }: { readonly order: StaffOrder; readonly menu: Menu }) {
  const { zone, locale } = menu.studio;
  return (
    <ol className="ml-1.5 grid border-l-2 border-cobalt">
      {order.events
        .toSorted((a, b) => b.seq - a.seq)
        .map((it) => (
          <li key={it.seq} className="relative py-1.5 pl-5">
            <svg
              viewBox="0 0 12 12"
              className="absolute top-3 -left-[7px] size-3"
              aria-hidden="true"
            >
              <circle
                cx="6"
                cy="6"
                r="4.6"
                fill="var(--color-enamel)"
                stroke="var(--color-cobalt)"
                strokeWidth="2"
              />
            </svg>
            <p>{it.sentence}</p>
            <p className="text-sm text-slate tabular-nums">
              {it.actor !== '' && `${it.actor}, `}
              {instantWords(it.at, zone, locale)}
            </p>
          </li>
        ))}
    </ol>
  );
}
