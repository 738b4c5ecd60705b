import { Link } from 'react-router-dom';
import type { CalendarLane } from '#shared/contracts/staff.ts';
import { StatusMark } from '#web/components/order/status-mark.tsx';
import { ToneGlyph } from '#web/components/ui/notice.tsx';
import { VisuallyHidden } from '#web/components/ui/visually-hidden.tsx';
import { paths } from '#web/config/paths.ts';
import { type LaneAct, laneActWords, laneActs } from './lane-act.ts';

type Props = { readonly lane: CalendarLane; readonly onAct: LaneAct };

/** Whose cake a lane is, how far it is, and what can be done about it at once. */
export function LaneName({ lane, onAct }: Props) {
  // One at a time: what comes next in the cake's life, the furthest along first.
  const act = laneActs.toReversed().find((it) => lane.can[it]);
  return (
    <div className="grid min-w-0 justify-items-start gap-0.5">
      <Link
        to={paths.staffOrder(lane.number)}
        className="inline-block max-w-full font-semibold text-ink underline decoration-transparent underline-offset-3 hover:decoration-current"
      >
        <span className="tabular-nums">{lane.number}</span> {lane.customer}
      </Link>
      <p className="text-sm leading-snug text-slate">{lane.summary}</p>
      {lane.allergies && (
        <p className="flex items-center gap-1.5 text-sm font-semibold text-berry">
          <ToneGlyph tone="berry" className="size-4" />
          allergy at the table
        </p>
      )}
      <div className="flex flex-wrap items-center gap-x-3">
        <StatusMark status={lane.status} className="text-sm" />
        {act !== undefined && (
          <button
            type="button"
            onClick={() => onAct(lane.number, act)}
            className="link -my-2.5 inline-flex min-h-11 items-center text-sm"
          >
            {laneActWords[act]}
            <VisuallyHidden>, No. {lane.number}</VisuallyHidden>
          </button>
        )}
      </div>
    </div>
  );
}
