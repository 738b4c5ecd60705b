import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { today as todayIn } from '#shared/dates/local-time.ts';
import { Failure } from '#web/components/ui/failure.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { useCalendar } from '#web/features/calendar/api/get-calendar.ts';
import { CalendarHead } from '#web/features/calendar/components/calendar-head.tsx';
import { DayTimeline } from '#web/features/calendar/components/day-timeline.tsx';
import { Legend } from '#web/features/calendar/components/legend.tsx';
import { MonthGrid } from '#web/features/calendar/components/month-grid.tsx';
import { WaitingColumn } from '#web/features/calendar/components/waiting-column.tsx';
import { WeekGrid } from '#web/features/calendar/components/week-grid.tsx';
import { WeekList } from '#web/features/calendar/components/week-list.tsx';
import { rangeOf, readPlace } from '#web/features/calendar/days/calendar-range.ts';
import { MarginLine } from '#web/features/kitchen-sheet/components/margin-line.tsx';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { useSession } from '#web/features/session/api/get-session.ts';
import { OrderActionDialog } from '#web/features/staff-order/actions/order-action-dialog.tsx';
import type { OrderAct } from '#web/features/staff-order/actions/order-act.ts';
import { classNames } from '#web/lib/class-names.ts';
import { roomForWeek, useMedia } from '#web/lib/use-media.ts';

type Acting = { readonly number: number; readonly act: OrderAct };

/** `/staff/calendar?view=week|month|day&date=` */
export function CalendarPage() {
  const menu = useMenu();
  const { locale, zone } = menu.studio;
  const owner = useSession().data?.user?.role === 'owner';
  const [search] = useSearchParams();
  const [acting, setActing] = useState<Acting | null>(null);
  const today = todayIn(new Date(), zone);
  const place = readPlace(search, today);
  const { from, to } = rangeOf(place);
  const { data, error, isPending, isPlaceholderData, isFetching, refetch } = useCalendar(from, to);
  const wide = useMedia(roomForWeek);
  const act = (number: number, what: OrderAct) => setActing({ number, act: what });
  const day = data?.days.find((it) => it.date === place.date);

  return (
    <div className="page grid gap-x-8 gap-y-8 py-5 xl:grid-cols-[minmax(0,1fr)_19rem]">
      <div className="grid min-w-0 content-start gap-3">
        <CalendarHead
          place={place}
          today={data?.today ?? today}
          locale={locale}
          waiting={data?.waiting.length ?? 0}
        />
        {isPending ? (
          <Pending what="Fetching the calendar…" />
        ) : data === undefined ? (
          <Failure error={error} onRetry={() => void refetch()} retrying={isFetching} />
        ) : (
          <>
            {error !== null && (
              <Failure error={error} onRetry={() => void refetch()} retrying={isFetching} />
            )}
            <Rim
              label="The days"
              className={classNames('overflow-hidden', isPlaceholderData && 'opacity-60')}
            >
              {place.view === 'week' &&
                (wide ? (
                  <WeekGrid key={from} view={data} locale={locale} onAct={act} />
                ) : (
                  <WeekList view={data} locale={locale} onAct={act} />
                ))}
              {place.view === 'month' && (
                <MonthGrid key={from} view={data} date={place.date} locale={locale} />
              )}
              {place.view === 'day' && day !== undefined && (
                <DayTimeline view={data} day={day} locale={locale} onAct={act} />
              )}
            </Rim>
            {place.view !== 'month' && <Legend />}
          </>
        )}
      </div>
      {data !== undefined && <WaitingColumn waiting={data.waiting} locale={locale} onAct={act} />}
      {acting !== null && (
        <OrderActionDialog
          {...acting}
          menu={menu}
          margin={owner && <MarginLine number={acting.number} locale={locale} />}
          onClose={() => setActing(null)}
        />
      )}
    </div>
  );
}
