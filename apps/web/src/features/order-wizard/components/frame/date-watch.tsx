import { useEffect, useRef, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { DayAnswer } from '#shared/contracts/dates.ts';
import { formatDay, formatTime } from '#shared/dates/format.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { paths } from '#web/config/paths.ts';
import { dateVerdict } from '../../dates/date-verdict.ts';
import { dayWord } from '../../dates/day-word.ts';
import { useDates } from '../../dates/use-dates.ts';
import type { OrderForm } from '../../draft/empty-order.ts';
import { useRested } from '../../wizard/use-rested.ts';
import { useWizard } from '../../wizard/wizard-context.ts';

/**
 * A day chosen before the cake was only likely: it is asked for again with every choice, and a
 * choice that would lose it says so, to be kept or taken back.
 */
export function DateWatch() {
  const { values, design, change, today } = useWizard();
  const navigate = useNavigate();
  const rested = useRested(design);
  const { day, askWithoutDate } = values;
  const { date, windowStart } = day;
  const dates = useDates(date === null ? null : rested, date ?? today, date ?? today);
  const answer = date === null ? null : (dates.days.get(date) ?? null);
  const verdict = dateVerdict(answer, windowStart, askWithoutDate);
  const [lastStood, setLastStood] = useState<OrderForm | null>(null);

  const box = useRef<HTMLDivElement>(null);
  const shown = date !== null && answer !== null && (verdict === 'lost' || verdict === 'to-ask');

  // It stands at the foot of the screen and must not cover what is being typed in.
  useEffect(() => {
    if (shown) document.activeElement?.scrollIntoView({ block: 'center' });
  }, [shown]);

  // The answer is about these very answers only once typing has rested.
  if (verdict === 'stands' && rested === design && lastStood !== values) setLastStood(values);
  if (date === null || answer === null || rested !== design) return null;
  if (verdict === 'unknown' || verdict === 'stands') return null;

  const when = `${formatDay(date)}${windowStart === null ? '' : `, ${formatTime(windowStart)}`}`;
  const undo = lastStood !== null && lastStood.day.date === date ? lastStood : null;
  const takeBack = (before: OrderForm) => {
    const { cake, setting, look, extras, day: dayBefore } = before;
    change({ cake, setting, look, extras, day: { ...dayBefore, date, windowStart } });
  };
  const chooseAnother = () => {
    change({ day: { ...day, date: null, windowStart: null }, askWithoutDate: false });
    void navigate(paths.orderStep('day'));
  };

  return (
    <div ref={box} className="sticky bottom-20 z-10 bg-enamel lg:bottom-4">
      <Notice
        className={verdict === 'lost' ? 'border-2 border-berry' : 'border-2 border-butter'}
        tone={verdict === 'lost' ? 'berry' : 'butter'}
        live="assertive"
        title={
          verdict === 'lost'
            ? `With this the cake cannot be ready for ${when}`
            : `With this we can no longer promise ${when}`
        }
      >
        <p>{reasonOf(answer, verdict)}</p>
        <div className="flex flex-wrap gap-3">
          {undo !== null && (
            <Button kind="secondary" onClick={() => takeBack(undo)}>
              Take the change back
            </Button>
          )}
          {verdict === 'to-ask' && (
            <Button kind="secondary" onClick={() => change({ askWithoutDate: true })}>
              Keep it and ask for the day
            </Button>
          )}
          <Button kind="quiet" onClick={chooseAnother}>
            Keep it and choose another day
          </Button>
        </div>
      </Notice>
    </div>
  );
}

function reasonOf(answer: DayAnswer, verdict: 'lost' | 'to-ask'): string {
  if (verdict === 'to-ask')
    return 'You may still ask for it: the baker looks at it and answers you.';
  return answer.answer === 'closed' ? dayWord(answer).said : 'That pickup time is taken by now.';
}
