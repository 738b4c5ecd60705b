import { useQuery } from '@tanstack/react-query';
import type { DayAnswer } from '#shared/contracts/dates.ts';
import type { Design } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { formatDay, formatTime, formatWeekday } from '#shared/dates/format.ts';
import { addDays, today, weekdayOf } from '#shared/dates/local-time.ts';
import { Failure } from '#web/components/ui/failure.tsx';
import { Jug } from '#web/components/ui/jug.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { datesQuery } from '#web/features/order-wizard/api/get-dates.ts';

const shownDays = 6;
const askedDays = 56;
const typicalHeadCount = 20;

/** The next days a cake for twenty or so can be had, as the order itself would answer. */
export function useOpenDays(menu: Menu) {
  const from = today(new Date(), menu.studio.zone);
  const design: Design = {
    guests: {
      headCount: typicalHeadCount,
      occasionId: menu.occasions[0]?.id ?? '',
      otherDesserts: false,
      portionSizeId: 'dessert',
      allergies: [],
      diets: [],
      dietNote: '',
      infants: false,
      susceptible: false,
    },
    cake: null,
    setting: null,
    look: null,
    extras: [],
  };
  return useQuery(datesQuery(design, from, addDays(from, askedDays)));
}

type Dates = ReturnType<typeof useOpenDays>;

export function OpenDays({ dates, locale }: { readonly dates: Dates; readonly locale: string }) {
  if (dates.isPending) return <Pending what="Asking the kitchen…" />;
  if (dates.error) return <Failure error={dates.error} onRetry={() => void dates.refetch()} />;
  const open = dates.data.days
    .filter((it) => it.answer === 'open' || it.answer === 'last-place')
    .slice(0, shownDays);
  if (open.length === 0) {
    return <p>The next weeks are full. Later days open as you order, or ask us.</p>;
  }
  return (
    <ol className="grid gap-x-8 sm:grid-cols-2 lg:grid-cols-3">
      {open.map((day) => (
        <li key={day.date} className="flex items-center gap-4 border-b border-seam py-3">
          <Jug fill={day.fill} className="h-9" />
          <div>
            <p className="font-display text-lg leading-tight font-semibold">
              {formatDay(day.date, { locale })}
            </p>
            <p className="text-slate">
              {day.answer === 'last-place' ? 'The last place' : loadWord(day.fill)}
            </p>
          </div>
        </li>
      ))}
    </ol>
  );
}

function loadWord(fill: number): string {
  if (fill < 0.25) return 'The bench is nearly free';
  if (fill < 0.7) return 'There is room';
  return 'Nearly full';
}

/** When cakes are handed over, by weekday, as the coming weeks have it. */
export function PickupHours({ dates, locale }: { readonly dates: Dates; readonly locale: string }) {
  const rows = hoursByWeekday(dates.data?.days ?? []);
  if (rows.length === 0) return null;
  return (
    <dl className="grid w-fit grid-cols-[auto_auto] gap-x-8 gap-y-1 tabular-nums">
      {rows.map(({ sample, from, to }) => (
        <div key={sample} className="contents">
          <dt>{formatWeekday(sample, 'long', locale)}</dt>
          <dd>
            {formatTime(from)} to {formatTime(to)}
          </dd>
        </div>
      ))}
    </dl>
  );
}

type Hours = {
  readonly sample: string;
  readonly weekday: number;
  readonly from: number;
  readonly to: number;
};

function hoursByWeekday(days: readonly DayAnswer[]): Hours[] {
  const found = new Map<number, Hours>();
  for (const { date, windows } of days) {
    if (windows.length === 0) continue;
    const weekday = weekdayOf(date);
    const from = Math.min(...windows.map((it) => it.start));
    const to = Math.max(...windows.map((it) => it.start + it.minutes));
    const known = found.get(weekday);
    found.set(weekday, {
      sample: known?.sample ?? date,
      weekday,
      from: Math.min(from, known?.from ?? from),
      to: Math.max(to, known?.to ?? to),
    });
  }
  return [...found.values()].sort((a, b) => a.weekday - b.weekday);
}
