import type { OrderRow } from '#shared/contracts/staff.ts';
import { isLive } from '#shared/orders/transitions.ts';
import { ToneGlyph } from '#web/components/ui/notice.tsx';

/** What about an order wants to be known before it is opened. */
export function RowMarks({ row }: { readonly row: OrderRow }) {
  // What is over wants nothing any more but to be read.
  const live = isLive(row.status);
  return (
    <span className="flex flex-wrap items-center gap-x-3 gap-y-0.5 text-sm">
      {live && row.worst === 'stop' && (
        <span className="inline-flex items-center gap-1.5 font-semibold text-berry">
          <ToneGlyph tone="berry" className="size-4" />
          {row.allergies ? 'allergy, settle first' : 'settle first'}
        </span>
      )}
      {live && row.worst !== 'stop' && row.allergies && (
        <span className="inline-flex items-center gap-1.5 font-semibold text-berry">
          <ToneGlyph tone="berry" className="size-4" />
          allergy
        </span>
      )}
      {live && row.worst === 'care' && (
        <span className="inline-flex items-center gap-1.5">
          <ToneGlyph tone="butter" className="size-4" />
          with care
        </span>
      )}
      {row.unread > 0 && (
        <span className="inline-flex items-center gap-1.5 font-semibold">
          <svg viewBox="0 0 14 11" className="h-3" aria-hidden="true">
            <rect
              x="0.8"
              y="0.8"
              width="12.4"
              height="9.4"
              rx="1.6"
              fill="var(--color-butter)"
              stroke="var(--color-ink)"
              strokeWidth="1.2"
            />
            <path
              d="M1.4 1.6L7 6.4l5.6-4.8"
              fill="none"
              stroke="var(--color-ink)"
              strokeWidth="1.2"
            />
          </svg>
          {row.unread} unread
        </span>
      )}
    </span>
  );
}
