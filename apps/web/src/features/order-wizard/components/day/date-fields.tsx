import { Suspense, lazy } from 'react';
import { formatDay } from '#shared/dates/format.ts';
import { FieldError } from '#web/components/ui/field-frame.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { fieldId } from '#web/lib/forms.ts';
import { useProblemAt } from '../../steps/use-answer.ts';
import { useRested } from '../../wizard/use-rested.ts';
import { useWizard } from '../../wizard/wizard-context.ts';

/** The picker is the largest part of this page, so the questions before it do not wait for it. */
const DayCalendar = lazy(async () => ({
  default: (await import('./day-calendar.tsx')).DayCalendar,
}));

/** Which day, and when on it the cake is collected. */
export function DateFields() {
  const { values, design } = useWizard();
  const rested = useRested(design);
  const problem = useProblemAt('day.date');
  const id = fieldId('day.date');
  const { headCount, date } = values.day;
  return (
    <section
      id={id}
      tabIndex={-1}
      aria-labelledby="date-heading"
      aria-describedby={problem ? `${id}-error` : undefined}
      className="grid gap-4"
    >
      <div className="grid gap-1">
        <h2 id="date-heading">Which day?</h2>
        {design === null && (
          <p className="text-slate">
            {Number.isFinite(headCount) && headCount > 0
              ? 'Choose the occasion, and the days our bench can keep appear here.'
              : 'Write how many will eat and choose the occasion, and the days our bench can keep appear here.'}
          </p>
        )}
        {design === null && date !== null && <p>You had chosen {formatDay(date)}.</p>}
      </div>
      <FieldError id={`${id}-error`} message={problem} />
      {rested !== null && design !== null && (
        <Suspense fallback={<Pending what="Opening the calendar…" />}>
          <DayCalendar design={rested} />
        </Suspense>
      )}
    </section>
  );
}
