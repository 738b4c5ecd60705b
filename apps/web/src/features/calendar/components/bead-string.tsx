import { useState } from 'react';
import type { CalendarLane, PlannedTask } from '#shared/contracts/staff.ts';
import { formatDay, formatDuration, formatTime } from '#shared/dates/format.ts';
import { TaskGlyph } from '#web/components/order/task-glyph.tsx';
import { classNames } from '#web/lib/class-names.ts';
import { useRoving } from '#web/lib/use-roving.ts';
import { labelWidth } from '../string/label-width.ts';
import { type Bead, endInset, pickupHalf, stringBeads } from '../string/string-beads.ts';
import type { TimeScale } from '../string/time-scale.ts';

type Props = {
  readonly lane: CalendarLane;
  readonly scale: TimeScale;
  readonly locale: string;
};

/** Where the thread runs, pixels from the string's top. */
const thread = 34;

/**
 * A cake's work, strung from its first bead to its pickup. One tab stop; the arrow keys go from
 * bead to bead, and the one in focus says what it is.
 */
export function BeadString({ lane, scale, locale }: Props) {
  const { pickup } = lane;
  const beyond = `pickup ${formatDay(pickup.date, { locale })}`;
  const string = stringBeads(lane, scale, labelWidth, beyond);
  const itemAt = useRoving(string.beads.length, 0);
  const [looked, setLooked] = useState<string | null>(null);
  const shown = string.beads.find((it) => it.key === looked) ?? null;

  return (
    <div className="relative min-h-[68px] pb-1">
      <svg
        width={scale.width}
        height="68"
        className="pointer-events-none absolute inset-0 overflow-visible"
        aria-hidden="true"
      >
        <line
          x1={string.from}
          x2={string.to}
          y1={thread}
          y2={thread}
          stroke="var(--color-ink)"
          strokeWidth="1.6"
        />
        {string.goesOn && (
          <path
            d={`M${scale.width - 7} ${thread - 5}l6 5-6 5`}
            fill="none"
            stroke="var(--color-ink)"
            strokeWidth="1.6"
          />
        )}
      </svg>
      <div role="group" aria-label={`Work on No. ${lane.number}`}>
        {string.beads.map((bead, at) => (
          <button
            key={bead.key}
            type="button"
            {...itemAt(at)}
            aria-label={beadWords(bead, locale)}
            title={beadWords(bead, locale)}
            onFocus={() => {
              itemAt(at).onFocus();
              setLooked(bead.key);
            }}
            onBlur={() => setLooked(null)}
            onClick={() => setLooked(bead.key)}
            className="absolute grid size-6 -translate-1/2 place-items-center rounded-round"
            style={{ left: bead.x, top: thread }}
          >
            <TaskGlyph sort={bead.sort} done={bead.tasks.every((it) => it.state === 'finished')} />
            {bead.tasks.some((it) => it.state === 'late') && (
              <span className="absolute -top-1 right-0 font-display text-sm font-bold text-berry">
                !
              </span>
            )}
          </button>
        ))}
        {string.beads.map(
          (bead) =>
            bead.side !== null && (
              <span
                key={bead.key}
                aria-hidden="true"
                className="pointer-events-none absolute -translate-x-1/2 text-[0.8125rem] leading-none whitespace-nowrap"
                style={{ left: bead.x, top: bead.side === 'above' ? 3 : 52 }}
              >
                {bead.label}
              </span>
            ),
        )}
      </div>
      {string.pickup !== null && (
        <span
          className="absolute grid h-8 -translate-1/2 place-items-center rounded-action border-2 border-cobalt bg-enamel font-display text-sm font-bold text-cobalt tabular-nums"
          style={{ left: string.pickup, top: thread, width: 2 * pickupHalf }}
        >
          <span aria-hidden="true">{formatTime(pickup.start)}</span>
          <span className="sr-only">
            Pickup {formatDay(pickup.date, { locale })} at {formatTime(pickup.start)}
          </span>
        </span>
      )}
      {string.goesOn && (
        <span
          className="absolute text-[0.8125rem] leading-none text-slate"
          style={{ top: 52, right: endInset }}
        >
          {beyond}
        </span>
      )}
      <p
        role="status"
        className={classNames(
          'text-sm empty:hidden',
          shown !== null && 'relative mt-[66px] bg-cobalt-tint px-3 py-1.5',
        )}
      >
        {shown !== null && shown.tasks.map((it) => taskSentence(it, locale)).join(' ')}
      </p>
    </div>
  );
}

function beadWords(bead: Bead, locale: string): string {
  return bead.tasks.map((it) => taskSentence(it, locale)).join(' ');
}

/** "Bake vanilla, Wednesday 16 June 08:00, 40 min." */
export function taskSentence(task: PlannedTask, locale: string): string {
  const state =
    task.state === 'finished'
      ? ', done'
      : task.state === 'started'
        ? ', begun'
        : task.state === 'late'
          ? ', late'
          : '';
  return `${task.label}, ${formatDay(task.date, { locale })} ${formatTime(task.start)}, ${formatDuration(task.minutes)}${state}.`;
}
