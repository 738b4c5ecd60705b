import { type Dispatch, useState } from 'react';
import type { PantryIndex } from '#shared/kitchen/formulas/pantry-index.ts';
import { readFormulaText } from '#shared/kitchen/formulas/read-formula-text.ts';
import { Button } from '#web/components/ui/button.tsx';
import { TextArea } from '#web/components/ui/text-area.tsx';
import { Unfold } from '#web/components/ui/unfold.tsx';
import type { EditorAction, Pasted } from './editor-actions.ts';

type Props = { readonly index: PantryIndex; readonly dispatch: Dispatch<EditorAction> };

/** A whole recipe at once: what cannot be read stays as typed, marked, at its place. */
export function PasteLines({ index, dispatch }: Props) {
  return (
    <Unfold label="Type several at once" kind="quiet">
      {(fold) => <PasteForm index={index} dispatch={dispatch} onDone={fold} />}
    </Unfold>
  );
}

function PasteForm({ index, dispatch, onDone }: Props & { readonly onDone: () => void }) {
  const [text, setText] = useState('');
  return (
    <div className="grid w-full gap-3 sm:min-w-96">
      <TextArea
        label="The recipe"
        hint="One line each: “1 1/2 cups milk, 340 g”. A line like “For the custard:” begins a step."
        rows={8}
        value={text}
        onChange={(event) => setText(event.target.value)}
      />
      <div className="flex flex-wrap gap-2">
        <Button
          onClick={() => {
            if (text.trim() !== '') dispatch({ type: 'paste', pasted: pastedOf(text, index) });
            onDone();
          }}
        >
          Read the lines
        </Button>
        <Button kind="quiet" onClick={onDone}>
          Leave it
        </Button>
      </div>
    </div>
  );
}

/** Every line of it, headings apart. */
function pastedOf(text: string, index: PantryIndex): Pasted {
  const { lines, stages } = readFormulaText(text, index);
  return {
    headings: stages,
    lines: lines
      .filter((it) => it.kind === 'line')
      .map((it) => ({ text: it.asTyped.trim(), stage: it.stage })),
  };
}
