import type { CalendarDay, CalendarView } from '#shared/contracts/staff.ts';
import { formatDay } from '#shared/dates/format.ts';
import { classNames } from '#web/lib/class-names.ts';
import { cakesOf, pickupsOf } from '../days/work-of-day.ts';
import { CakeRow } from './cake-row.tsx';
import { DayExplained } from './day-explained.tsx';
import { DayJug, LoadLines } from './jug-mark.tsx';
import type { LaneAct } from './lane-act.ts';
import { LaneName } from './lane-name.tsx';
import { PickupBox } from './work-row.tsx';

type Props = {
  readonly view: CalendarView;
  readonly locale: string;
  readonly onAct: LaneAct;
};

/** The week on a narrow screen: one day under the other, each with its jug, pickups and work. */
export function WeekList({ view, locale, onAct }: Props) {
  return (
    <ol className="divide-y divide-seam">
      {view.days.map((day) => (
        <li
          key={day.date}
          className={classNames(
            'grid gap-3 px-4 py-4 first:rounded-t-[12px] last:rounded-b-[12px]',
            day.date === view.today && 'bg-butter-tint',
          )}
        >
          <OneDay day={day} view={view} locale={locale} onAct={onAct} />
        </li>
      ))}
    </ol>
  );
}

function OneDay({ day, view, locale, onAct }: Props & { readonly day: CalendarDay }) {
  const pickups = pickupsOf(view.lanes, day.date);
  const cakes = cakesOf(view.lanes, day.date);
  return (
    <>
      <div className="flex items-center gap-3">
        <DayJug day={day} className="h-9" />
        <div>
          <h2 className="text-lg">
            {formatDay(day.date, { locale })}
            {day.date === view.today && <span className="font-normal">, today</span>}
          </h2>
          <LoadLines day={day} />
        </div>
      </div>
      {pickups.length > 0 && (
        <ul aria-label="Pickups" className="grid gap-3">
          {pickups.map((lane) => (
            <li key={lane.number} className="flex items-start gap-3">
              <PickupBox start={lane.pickup.start} />
              <LaneName lane={lane} onAct={onAct} />
            </li>
          ))}
        </ul>
      )}
      {cakes.length > 0 && (
        <ul aria-label="Work" className="grid gap-3">
          {cakes.map((cake) => (
            <li key={cake.lane.number}>
              <CakeRow cake={cake} />
            </li>
          ))}
        </ul>
      )}
      <details>
        <summary className="link -mx-1 inline-flex min-h-11 items-center px-1">
          About this day
        </summary>
        <DayExplained
          day={day}
          waiting={view.waiting}
          mayBlock={view.can.blockDays}
          locale={locale}
        />
      </details>
    </>
  );
}
