import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { formatDay, formatWindow } from '#shared/dates/format.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { paths } from '#web/config/paths.ts';
import { datesQuery } from '../../api/get-dates.ts';
import { nearestWindow } from '../../dates/nearest-window.ts';
import type { SendRefusal } from '../../send/refusal.ts';
import { fromCheck } from '../../steps/use-step.ts';
import { useWizard } from '../../wizard/wizard-context.ts';

type Props = {
  readonly refusal: Extract<SendRefusal, { kind: 'date-gone' }>;
  readonly onChosen: () => void;
};

/** The day went while the order was made: the rest stays, and the nearest open days can be pressed. */
export function DateGone({ refusal, onChosen }: Props) {
  const { values, design, change } = useWizard();
  const client = useQueryClient();
  const toast = useToast();
  const [choosing, setChoosing] = useState<string | null>(null);
  const [error, setError] = useState<unknown>(null);
  const { day } = values;

  const choose = async (date: string) => {
    setChoosing(date);
    setError(null);
    try {
      const answer = await client.fetchQuery({ ...datesQuery(design, date, date), staleTime: 0 });
      const window = nearestWindow(answer.days[0] ?? null, day.windowStart);
      if (window === null) {
        toast({ message: `${formatDay(date)} has gone too; please take another.` });
        return;
      }
      change({
        day: { ...day, date, windowStart: window.start },
        askWithoutDate: window.answer === 'ask-us',
      });
      toast({
        message: `Now ${formatDay(date)}, ${formatWindow(window.start, window.minutes)}. Press Send again.`,
      });
      onChosen();
    } catch (failure) {
      setError(failure);
    } finally {
      setChoosing(null);
    }
  };

  return (
    <Notice
      tone="butter"
      live="assertive"
      title={day.date === null ? 'That day has just gone' : `${formatDay(day.date)} has just gone`}
    >
      <p>
        {refusal.sentence} Everything else is kept.
        {refusal.nearest.length > 0 && ' The nearest days the bench can keep:'}
      </p>
      <div className="flex flex-wrap gap-3">
        {refusal.nearest.map((date) => (
          <Button
            key={date}
            kind="secondary"
            pending={choosing === date}
            onClick={() => void choose(date)}
          >
            {formatDay(date)}
          </Button>
        ))}
        <Link
          to={paths.orderStep('day')}
          state={fromCheck}
          className="link inline-flex min-h-11 items-center"
        >
          See the calendar
        </Link>
      </div>
      {error !== null && <Failure error={error} />}
    </Notice>
  );
}
