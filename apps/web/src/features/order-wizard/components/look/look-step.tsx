import { TextArea } from '#web/components/ui/text-area.tsx';
import { useAnswer } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { StepPage } from '../frame/step-page.tsx';
import { CoatColourFields } from './coat-colour-fields.tsx';
import { DecorationFields } from './decoration-fields.tsx';
import { ExtraFields } from './extra-fields.tsx';
import { PaletteFields } from './palette-fields.tsx';
import { PhotoFields } from './photo-fields.tsx';
import { TierColours } from './tier-colours.tsx';
import { WordsFields } from './words-fields.tsx';

/** Colours, words, decorations, pictures to go by: all of it optional. */
export function LookStep() {
  const note = useAnswer('look.note');
  const { values, change } = useWizard();
  const { cake } = values;
  return (
    <StepPage step="look">
      <PhotoFields />
      <section className="grid gap-6" aria-labelledby="colours-heading">
        <h2 id="colours-heading">Colors</h2>
        {cake.coating !== null && (
          <CoatColourFields
            coating={cake.coating}
            name="cake.coating.colour"
            legend="Color of the coat"
            ownLabel="Another color for the coat"
            onCoating={(coating, undo) => change({ cake: { ...cake, coating } }, undo)}
          />
        )}
        <TierColours />
        <PaletteFields />
      </section>
      <WordsFields />
      <DecorationFields />
      <ExtraFields />
      <TextArea
        name={note.name}
        label="Anything else about the look"
        optional
        maxLength={2000}
        error={note.error}
        value={note.value}
        onChange={(event) => note.onValue(event.target.value)}
      />
    </StepPage>
  );
}
