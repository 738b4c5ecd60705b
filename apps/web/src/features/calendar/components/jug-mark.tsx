import type { CalendarDay } from '#shared/contracts/staff.ts';
import { Jug } from '#web/components/ui/jug.tsx';
import { classNames } from '#web/lib/class-names.ts';
import { fillOf, hoursWords, loadOf, loadWords } from '../days/day-load.ts';

/** A day's jug; an empty kitchen has none. */
export function DayJug({
  day,
  className,
}: {
  readonly day: CalendarDay;
  readonly className?: string;
}) {
  return loadOf(day) === 'closed' ? null : <Jug fill={fillOf(day)} className={className} />;
}

/** The hours on the jug, and the word under them. */
export function LoadLines({
  day,
  className,
}: {
  readonly day: CalendarDay;
  readonly className?: string;
}) {
  const load = loadOf(day);
  return (
    <span
      className={classNames(
        'grid text-[0.8125rem] leading-snug tabular-nums lg:text-sm',
        className,
      )}
    >
      {load !== 'closed' && <span className="whitespace-nowrap text-slate">{hoursWords(day)}</span>}
      <span
        className={
          load === 'overfull'
            ? 'font-semibold text-berry'
            : load === 'full'
              ? 'font-semibold'
              : 'text-slate'
        }
      >
        {loadWords(day)}
      </span>
    </span>
  );
}
