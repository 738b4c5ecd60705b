import type { DayAnswer } from '#shared/contracts/dates.ts';
import { formatDay, formatTime, formatWindow } from '#shared/dates/format.ts';
import { ChipChoice } from '#web/components/ui/chips.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { dayWord } from '../../dates/day-word.ts';
import { useAnswer } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';

/** When on the chosen day the cake is collected. */
export function WindowChoice({ day }: { readonly day: DayAnswer | null }) {
  const { values, change, menu } = useWizard();
  const start = useAnswer('day.windowStart');
  if (day === null) return null;
  const { open, said } = dayWord(day);
  if (!open && day.answer !== 'checking') {
    return (
      <Notice tone="butter" live="polite" title={`${formatDay(day.date)} no longer fits`}>
        <p>{said} Please choose another day; everything else stays.</p>
      </Notice>
    );
  }
  const windows = day.windows.filter((it) => it.answer !== 'closed');
  const chosen = windows.find((it) => it.start === start.value);
  const address = `${menu.studio.street}, ${menu.studio.town}`;
  return (
    <div className="grid gap-4">
      <ChipChoice
        name={start.name}
        large
        legend={`Collect on ${formatDay(day.date)}`}
        hint={
          chosen === undefined
            ? `At our counter, ${address}.`
            : `At our counter, ${address}, between ${formatWindow(chosen.start, chosen.minutes).replace(' to ', ' and ')}.`
        }
        error={start.error}
        chips={windows.map((it) => ({ value: String(it.start), label: formatTime(it.start) }))}
        value={start.value === null ? null : String(start.value)}
        onValue={(value) => {
          const window = windows.find((it) => String(it.start) === value);
          if (window === undefined) return;
          change({
            day: { ...values.day, windowStart: window.start },
            askWithoutDate: day.answer === 'ask-us' || window.answer === 'ask-us',
          });
        }}
      />
      {values.askWithoutDate && (
        <Notice tone="butter" title="This day is one to ask about">
          <p>
            You can design and send your order for it. No place is kept until the baker has looked;
            you get an answer within {menu.studio.answerHours} hours.
          </p>
        </Notice>
      )}
    </div>
  );
}
