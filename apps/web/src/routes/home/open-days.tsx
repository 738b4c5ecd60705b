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
      {rows.map(({ sample, spans }) => (
        <div key={sample} className="contents">
          <dt>{formatWeekday(sample, 'long', locale)}</dt>
          <dd>
            {spans.map(({ from, to }) => `${formatTime(from)} to ${formatTime(to)}`).join(', ')}
          </dd>
        </div>
      ))}
    </dl>
  );
}

type Span = { readonly from: number; readonly to: number };

type Hours = {
  readonly sample: string;
  readonly weekday: number;
  /** Windows that follow each other, joined; a midday pause stays one. */
  readonly spans: readonly Span[];
};

function hoursByWeekday(days: readonly DayAnswer[]): Hours[] {
  const found = new Map<number, { sample: string; windows: Span[] }>();
  for (const { date, windows } of days) {
    if (windows.length === 0) continue;
    const known = found.get(weekdayOf(date)) ?? { sample: date, windows: [] };
    known.windows.push(...windows.map((it) => ({ from: it.start, to: it.start + it.minutes })));
    found.set(weekdayOf(date), known);
  }
  return [...found]
    .map(([weekday, { sample, windows }]) => ({ sample, weekday, spans: joined(windows) }))
    .sort((a, b) => a.weekday - b.weekday);
}

function joined(windows: readonly Span[]): Span[] {
  return windows
    .toSorted((a, b) => a.from - b.from)
    .reduce<Span[]>((spans, it) => {
      const last = spans.at(-1);
      if (last === undefined || it.from > last.to) return [...spans, it];
      return [...spans.slice(0, -1), { from: last.from, to: Math.max(last.to, it.to) }];
    }, []);
}
