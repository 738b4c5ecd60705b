import { useId } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { isLocalDate } from '#shared/dates/local-time.ts';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { calendarViews, paths } from '#web/config/paths.ts';
import { classNames } from '#web/lib/class-names.ts';
import { type CalendarPlace, stepFrom, titleOf } from '../days/calendar-range.ts';

type Props = {
  readonly place: CalendarPlace;
  readonly today: string;
  readonly locale: string;
  readonly waiting: number;
};

/** Which days, how to get to others, and how much is shown at once. */
export function CalendarHead({ place, today, locale, waiting }: Props) {
  const title = titleOf(place, today, locale);
  const to = (date: string) => paths.staffCalendarAt(place.view, date);
  return (
    <div className="flex flex-wrap items-end gap-x-6 gap-y-1">
      <PageTitle title={`Calendar, ${title}`} className="text-3xl">
        {title}
      </PageTitle>
      <nav aria-label="Other days" className="-mx-2 flex flex-wrap items-center sm:mx-0">
        <Step to={to(stepFrom(place, -1))}>earlier</Step>
        <Step to={to(stepFrom(place, 1))}>later</Step>
        <Step to={to(today)}>today</Step>
        <GoTo key={place.date} place={place} />
      </nav>
      {waiting > 0 && (
        <a href="#waiting" className="link inline-flex min-h-11 items-center xl:hidden">
          {waiting === 1 ? '1 waits for you' : `${waiting} wait for you`}
        </a>
      )}
      <nav aria-label="How much" className="-mx-2 flex items-center sm:mx-0 sm:ml-auto">
        {calendarViews.map((view) => (
          <Link
            key={view}
            to={paths.staffCalendarAt(view, place.date)}
            aria-current={view === place.view ? 'page' : undefined}
            className={classNames(
              'inline-flex min-h-11 items-center border-b-3 px-2 font-semibold',
              view === place.view
                ? 'border-butter text-ink'
                : 'border-transparent text-slate hover:border-seam',
            )}
          >
            {view}
          </Link>
        ))}
      </nav>
    </div>
  );
}

function Step({ to, children }: { readonly to: string; readonly children: string }) {
  return (
    <Link to={to} className="link inline-flex min-h-11 items-center px-2">
      {children}
    </Link>
  );
}

/** Straight to a day. */
function GoTo({ place }: { readonly place: CalendarPlace }) {
  const id = useId();
  const navigate = useNavigate();
  return (
    <span className="inline-flex items-center">
      <label htmlFor={id} className="sr-only">
        Go to a day
      </label>
      <input
        id={id}
        type="date"
        defaultValue={place.date}
        className="ml-1 min-h-11 rounded-action border-[1.5px] border-seam px-2 text-sm tabular-nums hover:border-slate"
        onKeyDown={(event) => {
          if (event.key === 'Enter') go(event.currentTarget.value);
        }}
        onBlur={(event) => go(event.currentTarget.value)}
      />
    </span>
  );

  function go(date: string): void {
    if (isLocalDate(date) && date !== place.date) {
      void navigate(paths.staffCalendarAt(place.view, date));
    }
  }
}
