import { type ClipboardEvent, type Dispatch, type KeyboardEvent, memo } from 'react';
import type { PantryIndex } from '#shared/kitchen/formulas/pantry-index.ts';
import { FieldError, controlClasses } from '#web/components/ui/field-frame.tsx';
import { fieldId } from '#web/lib/forms.ts';
import { gramsText } from '#web/lib/grams-text.ts';
import type { EditorAction } from './editor-actions.ts';
import type { LineRow } from './editor-form.ts';
import { LineRemark } from './line-remark.tsx';
import { RowButtons } from './row-buttons.tsx';
import { readRow } from './read-row.ts';
import { rowName } from './typed-formula.ts';

/** What a row asks of the list it stands in. */
export type RowWishes = {
  readonly onAddAfter: (at: number, texts: readonly string[]) => void;
  readonly onMove: (key: number, at: number, by: 1 | -1) => void;
  readonly onRemove: (row: LineRow, at: number) => void;
};

type Props = {
  readonly row: LineRow;
  readonly at: number;
  readonly steps: number;
  readonly index: PantryIndex;
  readonly locale: string;
  /** What is wrong with it beside what its own text says. */
  readonly problem: string | undefined;
  readonly dispatch: Dispatch<EditorAction>;
  readonly wishes: RowWishes;
};

/** One line as bakers write it, and what it is taken for. Draws itself anew only if it changes. */
export const LineFields = memo(function LineFields(props: Props) {
  const { row, at, steps, index, locale, problem, dispatch, wishes } = props;
  const reading = readRow(row, index);
  const id = fieldId(rowName(row.key));
  const wrong = reading.problem ?? problem;
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.key === 'Enter') {
      event.preventDefault();
      wishes.onAddAfter(at, ['']);
    } else if (event.altKey && (event.key === 'ArrowUp' || event.key === 'ArrowDown')) {
      event.preventDefault();
      wishes.onMove(row.key, at, event.key === 'ArrowUp' ? -1 : 1);
    } else if (event.key === 'Backspace' && row.text === '') {
      event.preventDefault();
      wishes.onRemove(row, at);
    }
  };
  const onPaste = (event: ClipboardEvent<HTMLInputElement>) => {
    const [first = '', ...more] = event.clipboardData.getData('text').split(/\r?\n/);
    const rest = more.filter((it) => it.trim() !== '');
    if (rest.length === 0) return;
    event.preventDefault();
    const { value, selectionStart, selectionEnd } = event.currentTarget;
    const text =
      value.slice(0, selectionStart ?? value.length) +
      first +
      value.slice(selectionEnd ?? value.length);
    dispatch({ type: 'text', key: row.key, text, words: reading.words });
    wishes.onAddAfter(at, rest);
  };
  return (
    <>
      <input
        id={id}
        type="text"
        autoComplete="off"
        spellCheck={false}
        maxLength={200}
        aria-label={`Line ${at + 1}`}
        aria-invalid={wrong !== undefined && wrong !== null ? true : undefined}
        aria-describedby={`${id}-read`}
        value={row.text}
        className={controlClasses(wrong ?? undefined, 'min-w-0 max-sm:col-span-2')}
        onChange={(event) =>
          dispatch({
            type: 'text',
            key: row.key,
            text: event.target.value,
            words: reading.words,
          })
        }
        onKeyDown={onKeyDown}
        onPaste={onPaste}
      />
      <div
        id={`${id}-read`}
        className="col-span-full col-start-2 row-start-2 grid min-w-0 gap-1 pl-3"
      >
        {reading.problem === null && reading.grams !== null && (
          <p className="text-sm text-slate">
            {reading.name}, {gramsText(reading.grams, locale)}
            {reading.said.length > 0 && `; ${reading.said.join('; ')}`}
          </p>
        )}
        <FieldError id={`${id}-error`} message={wrong ?? undefined} />
        <LineRemark row={row} reading={reading} dispatch={dispatch} />
      </div>
      <span className="max-sm:col-start-3 max-sm:row-start-3 sm:col-start-5 sm:row-start-1">
        <RowButtons
          what={`line ${at + 1}`}
          onUp={() => wishes.onMove(row.key, at, -1)}
          onDown={() => wishes.onMove(row.key, at, 1)}
          onRemove={() => wishes.onRemove(row, at)}
        />
      </span>
      {steps > 1 && (
        <StepSelect
          at={at}
          step={row.step}
          steps={steps}
          onStep={(step) => dispatch({ type: 'line-step', key: row.key, step })}
        />
      )}
    </>
  );
});

type StepProps = {
  readonly at: number;
  readonly step: number;
  readonly steps: number;
  readonly onStep: (step: number) => void;
};

/** The step a line goes in at. */
function StepSelect({ at, step, steps, onStep }: StepProps) {
  return (
    <select
      aria-label={`Line ${at + 1} goes in at step`}
      value={step}
      className="min-h-11 rounded-action border-[1.5px] border-slate bg-enamel px-2 text-sm text-slate max-sm:col-start-2 max-sm:row-start-3 max-sm:justify-self-start sm:col-start-4 sm:row-start-1"
      onChange={(event) => onStep(Number(event.target.value))}
    >
      {Array.from({ length: steps }, (_, i) => (
        <option key={i} value={i}>
          step {i + 1}
        </option>
      ))}
    </select>
  );
}
