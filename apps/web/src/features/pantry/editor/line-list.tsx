import { type Dispatch, memo, useEffect, useMemo, useRef, useState } from 'react';
import type { PantryIndex } from '#shared/kitchen/formulas/pantry-index.ts';
import { Button } from '#web/components/ui/button.tsx';
import { FieldError } from '#web/components/ui/field-frame.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { type FieldProblem, fieldId } from '#web/lib/forms.ts';
import { problemAt } from '../forms/check-draft.ts';
import { percentText } from '../formulas/formula-words.ts';
import type { EditorAction } from './editor-actions.ts';
import type { LineRow } from './editor-form.ts';
import { LineFields, type RowWishes } from './line-row.tsx';
import { PasteLines } from './paste-lines.tsx';
import { rowName } from './typed-formula.ts';

type Props = {
  readonly lines: readonly LineRow[];
  readonly steps: number;
  readonly index: PantryIndex;
  readonly locale: string;
  readonly problems: readonly FieldProblem[];
  /** Percent by the row's key. */
  readonly percents: ReadonlyMap<number, number>;
  readonly dispatch: Dispatch<EditorAction>;
};

/** The lines of a formula, each typed as it would be written down. */
export const LineList = memo(function LineList(props: Props) {
  const { lines, steps, index, locale, problems, percents, dispatch } = props;
  const toast = useToast();
  const list = useRef<HTMLOListElement>(null);
  const goTo = useRef<number | null>(null);
  const count = useRef(lines.length);
  const [said, setSaid] = useState('');

  useEffect(() => {
    count.current = lines.length;
    if (goTo.current === null) return;
    const inputs = list.current?.querySelectorAll<HTMLInputElement>('input[type="text"]');
    inputs?.[Math.min(goTo.current, inputs.length - 1)]?.focus();
    goTo.current = null;
  }, [lines]);

  // The same wishes for every row and every keystroke, so that only the row typed in is drawn.
  const wishes = useMemo<RowWishes>(
    () => ({
      onAddAfter: (at, texts) => {
        goTo.current = at + texts.length;
        dispatch({ type: 'add-lines', at: at + 1, texts });
      },
      onMove: (key, at, by) => {
        const to = at + by;
        if (to < 0 || to >= count.current) return;
        goTo.current = to;
        setSaid(`Line ${at + 1} is now line ${to + 1}.`);
        dispatch({ type: 'move-line', key, by });
      },
      onRemove: (row, at) => {
        goTo.current = Math.max(0, at - 1);
        dispatch({ type: 'remove-line', key: row.key });
        if (row.text.trim() === '') return;
        toast({
          message: `“${row.text}” is taken away.`,
          onUndo: () => dispatch({ type: 'put-line', at, row }),
        });
      },
    }),
    [dispatch, toast],
  );

  return (
    <div className="grid gap-4">
      <FieldError id="lines-error" message={problemAt(problems, 'lines')} />
      <ol ref={list} id={fieldId('lines')} tabIndex={-1} className="border-t border-seam">
        {lines.map((row, at) => (
          <li
            key={row.key}
            className="grid grid-cols-[1.25rem_minmax(0,1fr)_auto] items-center gap-x-2 gap-y-1 border-b border-seam py-2 sm:grid-cols-[1.75rem_minmax(0,1fr)_4rem_auto_auto]"
          >
            <span className="text-right text-sm text-slate tabular-nums" aria-hidden="true">
              {at + 1}
            </span>
            <LineFields
              row={row}
              at={at}
              steps={steps}
              index={index}
              locale={locale}
              problem={problemAt(problems, rowName(row.key))}
              dispatch={dispatch}
              wishes={wishes}
            />
            <span className="text-right text-sm text-slate tabular-nums max-sm:col-start-2 max-sm:row-start-3 max-sm:pr-2 sm:col-start-3 sm:row-start-1">
              {percents.has(row.key) && percentText(percents.get(row.key) ?? 0, locale)}
            </span>
          </li>
        ))}
      </ol>
      <p role="status" className="sr-only">
        {said}
      </p>
      <div className="flex flex-wrap items-start gap-2 has-[textarea]:grid has-[textarea]:justify-items-start has-[textarea]:*:last:w-full">
        <Button kind="secondary" onClick={() => wishes.onAddAfter(lines.length - 1, [''])}>
          Add a line
        </Button>
        <PasteLines index={index} dispatch={dispatch} />
      </div>
      <p className="text-sm text-slate">
        Enter adds a line, Alt with an arrow moves it, and several pasted lines become as many.
      </p>
    </div>
  );
});
