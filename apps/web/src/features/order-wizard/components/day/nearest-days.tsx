import { formatDay } from '#shared/dates/format.ts';
import type { LocalDate } from '#shared/dates/local-time.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { monthRange } from '../../dates/calendar-day.ts';
import { dayWord } from '../../dates/day-word.ts';
import type { Dates } from '../../dates/use-dates.ts';

type Props = {
  readonly dates: Dates;
  readonly month: LocalDate;
  readonly onMonth: (month: LocalDate) => void;
};

/** A month without a day to press leads to the nearest that has one. */
export function NearestDays({ dates, month, onMonth }: Props) {
  const { days, firstOpen, pending } = dates;
  const any = [...days.values()].some((it) => dayWord(it).open || it.answer === 'checking');
  if (pending || days.size === 0 || any) return null;
  if (firstOpen === null || monthRange(firstOpen).from === month) {
    return (
      <Notice tone="butter" live="polite" title="No day of this month is open for that cake">
        <p>Look at another month, or write to us: sometimes something moves.</p>
      </Notice>
    );
  }
  return (
    <Notice tone="butter" live="polite" title="No day of this month is open for that cake">
      <p>The nearest open day is {formatDay(firstOpen, { year: true })}.</p>
      <div>
        <Button kind="secondary" onClick={() => onMonth(monthRange(firstOpen).from)}>
          Go to {formatDay(firstOpen, { weekday: false })}
        </Button>
      </div>
    </Notice>
  );
}
