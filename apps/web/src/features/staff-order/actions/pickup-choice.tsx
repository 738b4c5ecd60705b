import { useState } from 'react';
import type { DayAnswer } from '#shared/contracts/dates.ts';
import type { StudioCard } from '#shared/contracts/menu.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { formatDay, formatMonth, formatTime, formatWeekday } from '#shared/dates/format.ts';
import { addDays, today } from '#shared/dates/local-time.ts';
import { Button } from '#web/components/ui/button.tsx';
import { ChipChoice } from '#web/components/ui/chips.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { Fieldset } from '#web/components/ui/fieldset.tsx';
import { Jug } from '#web/components/ui/jug.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { classNames } from '#web/lib/class-names.ts';
import { useDatesToMove } from '../api/get-dates-to-move.ts';

export type Chosen = { readonly date: string; readonly start: number };

type Props = {
  readonly order: StaffOrder;
  readonly studio: StudioCard;
  readonly chosen: Chosen;
  readonly error?: string | undefined;
  readonly onChosen: (chosen: Chosen) => void;
};

/** Two whole weeks, so that the same weekday stands above and below itself. */
const shownDays = 14;

const answerWords: Readonly<Record<DayAnswer['answer'], string>> = {
  open: 'open',
  'last-place': 'last place',
  'ask-us': 'no place yet',
  checking: 'checking',
  closed: 'closed',
};

/** Two weeks of days, each with how full the bench is and what that means for this cake. */
export function PickupChoice({ order, studio, chosen, error, onChosen }: Props) {
  const now = today(new Date(), studio.zone);
  const near = addDays(order.pickup.date, -4);
  const [from, setFrom] = useState(near < now ? now : near);
  const dates = useDatesToMove(order.number, from, addDays(from, shownDays - 1));
  const days = dates.data?.days ?? [];
  const day = days.find((it) => it.date === chosen.date);
  const standing = chosen.date === order.pickup.date;

  return (
    <div className="grid gap-4">
      <Fieldset legend="To which day" name="date" error={error}>
        <div className="flex flex-wrap items-center justify-between gap-2">
          <span className="font-display font-semibold">{formatMonth(from, studio.locale)}</span>
          <span className="flex gap-1">
            <Button kind="quiet" onClick={() => setFrom(later(addDays(from, -shownDays), now))}>
              earlier
            </Button>
            <Button kind="quiet" onClick={() => setFrom(addDays(from, shownDays))}>
              later
            </Button>
          </span>
        </div>
        {dates.isPending ? (
          <Pending what="Asking the plan…" />
        ) : dates.isError ? (
          <Failure error={dates.error} onRetry={() => void dates.refetch()} />
        ) : (
          <div
            className={classNames(
              'grid grid-cols-[repeat(auto-fill,minmax(4.25rem,1fr))] gap-2 sm:grid-cols-7',
              dates.isPlaceholderData && 'opacity-60',
            )}
          >
            {days.map((it) => (
              <DayChoice
                key={it.date}
                day={it}
                locale={studio.locale}
                checked={it.date === chosen.date}
                onChoose={() => onChosen({ date: it.date, start: firstStart(it, chosen.start) })}
              />
            ))}
          </div>
        )}
      </Fieldset>
      {day?.answer === 'ask-us' && !standing && (
        <Notice tone="butter" title="The plan has no place for this cake that day" live="polite">
          <p>
            {day.reason?.sentence ??
              'It can be moved there, but stays without a promise until the plan finds one.'}
          </p>
        </Notice>
      )}
      {day !== undefined && day.windows.length > 0 && (
        <ChipChoice
          legend={`When, on ${formatDay(day.date, { locale: studio.locale })}`}
          name="windowStart"
          value={String(chosen.start)}
          onValue={(value) => onChosen({ date: day.date, start: Number(value) })}
          chips={day.windows
            .filter((it) => it.answer !== 'closed' || it.start === chosen.start)
            .map((it) => ({ value: String(it.start), label: formatTime(it.start) }))}
        />
      )}
    </div>
  );
}

function later(a: string, b: string): string {
  return a > b ? a : b;
}

/** The window of the same hour if the day has it, else the day's first that is not taken. */
function firstStart(day: DayAnswer, wished: number): number {
  const free = day.windows.filter((it) => it.answer !== 'closed');
  return (free.find((it) => it.start === wished) ?? free[0])?.start ?? wished;
}

type DayProps = {
  readonly day: DayAnswer;
  readonly locale: string;
  readonly checked: boolean;
  readonly onChoose: () => void;
};

function DayChoice({ day, locale, checked, onChoose }: DayProps) {
  const closed = day.answer === 'closed';
  const word =
    closed && day.reason?.code !== 'closed-day' ? reasonWord(day) : answerWords[day.answer];
  return (
    <label
      className={classNames(
        'grid min-h-20 justify-items-center gap-0.5 rounded-action border-[1.5px] px-1 py-2 text-center',
        'has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-cobalt',
        checked
          ? 'border-cobalt bg-cobalt-tint ring-1 ring-cobalt'
          : closed
            ? 'border-transparent text-slate'
            : 'cursor-pointer border-seam hover:border-cobalt',
      )}
    >
      <input
        type="radio"
        name="move-date"
        className="sr-only"
        checked={checked}
        disabled={closed && !checked}
        onChange={onChoose}
        aria-label={`${formatDay(day.date, { locale })}: ${day.reason?.sentence ?? word}`}
      />
      <span aria-hidden="true" className="text-xs">
        {formatWeekday(day.date, 'short', locale)}
      </span>
      <span aria-hidden="true" className="font-display font-semibold tabular-nums">
        {Number(day.date.slice(8))}
      </span>
      {!closed && <Jug fill={day.fill} className="h-5" />}
      <span aria-hidden="true" className="text-xs">
        {word}
      </span>
    </label>
  );
}

function reasonWord(day: DayAnswer): string {
  switch (day.reason?.code) {
    case 'too-soon':
      return 'too soon';
    case 'too-far':
      return 'not open yet';
    case 'window-full':
    case 'full':
      return 'full';
    case 'too-big':
      return 'too big';
    default:
      return 'closed';
  }
}
