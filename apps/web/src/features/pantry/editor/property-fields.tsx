import { type Dispatch, memo, useState } from 'react';
import { mlPerUsCup, type TemperatureLead } from '#shared/kitchen/measures.ts';
import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { TextArea } from '#web/components/ui/text-area.tsx';
import { type FieldProblem, fieldId } from '#web/lib/forms.ts';
import { FormulaDab } from '../formulas/formula-dab.tsx';
import { AmountField } from '../forms/amount-field.tsx';
import { problemAt } from '../forms/check-draft.ts';
import { gramsOf } from '../forms/read-amounts.ts';
import type { EditorAction } from './editor-actions.ts';
import type { EditorFields } from './editor-form.ts';
import { bothScales } from './step-fields.tsx';

type Props = {
  readonly fields: EditorFields;
  readonly lead: TemperatureLead;
  readonly problems: readonly FieldProblem[];
  readonly dispatch: Dispatch<EditorAction>;
};

/** What comes out of it, how heavy it is, how long it keeps. */
export const PropertyFields = memo(function PropertyFields(props: Props) {
  return (
    <>
      <ComesOut {...props} />
      <Keeping {...props} />
      <Section title="Note">
        <TextArea
          label={<span className="sr-only">Note</span>}
          name="note"
          rows={3}
          value={props.fields.note}
          error={problemAt(props.problems, 'note')}
          onChange={(event) =>
            props.dispatch({ type: 'fields', fields: { note: event.target.value } })
          }
        />
      </Section>
    </>
  );
});

function ComesOut({ fields, problems, dispatch }: Props) {
  const set = (change: Partial<EditorFields>) => dispatch({ type: 'fields', fields: change });
  return (
    <Section title="What comes out">
      <div className="flex flex-wrap items-start gap-x-5 gap-y-4">
        <AmountField
          label="Yield"
          hint="What is left of what goes in."
          name="yieldPpm"
          unit="%"
          className="max-w-24 tabular-nums"
          value={fields.yieldPercent}
          error={problemAt(problems, 'yieldPpm')}
          onText={(yieldPercent) => set({ yieldPercent })}
        />
        {fields.kind === 'sponge' && (
          <AmountField
            label="Baking takes"
            hint="Part of what the yield says; the tins go by it."
            name="bakeLossPpm"
            unit="%"
            className="max-w-24 tabular-nums"
            value={fields.bakeLossPercent}
            error={problemAt(problems, 'bakeLossPpm')}
            onText={(bakeLossPercent) => set({ bakeLossPercent })}
          />
        )}
        <ColourField colour={fields.baseColour} problems={problems} onColour={set} />
      </div>
      <DensityFields density={fields.density} problems={problems} onDensity={set} />
    </Section>
  );
}

type DensityProps = {
  readonly density: string;
  readonly problems: readonly FieldProblem[];
  readonly onDensity: (change: Pick<EditorFields, 'density'>) => void;
};

/** The density itself, or the studio's own by the weight of a level cup (236.5882365 mL). */
function DensityFields({ density, problems, onDensity }: DensityProps) {
  const [cup, setCup] = useState('');
  return (
    <div className="flex flex-wrap items-start gap-x-5 gap-y-4">
      <AmountField
        label="Density"
        hint="Of what comes out; amounts per tier go by it."
        name="densityGPerMl"
        unit="g/mL"
        className="max-w-24 tabular-nums"
        value={density}
        error={problemAt(problems, 'densityGPerMl')}
        onText={(text) => {
          setCup('');
          onDensity({ density: text });
        }}
      />
      <AmountField
        label="or a level cup of it weighs"
        hint="Fill one, level it, weigh it without the cup, type the grams."
        name="levelCup"
        unit="g"
        className="max-w-24 tabular-nums"
        value={cup}
        onText={(text) => {
          setCup(text);
          const grams = gramsOf(text);
          if (grams !== null && grams > 0) {
            onDensity({ density: String(Math.round((grams / mlPerUsCup) * 1000) / 1000) });
          }
        }}
      />
    </div>
  );
}

type ColourProps = {
  readonly colour: string;
  readonly problems: readonly FieldProblem[];
  readonly onColour: (change: Pick<EditorFields, 'baseColour'>) => void;
};

function ColourField({ colour, problems, onColour }: ColourProps) {
  const picker = `${fieldId('baseColour')}-picker`;
  const known = /^#[0-9a-f]{6}$/i.test(colour);
  return (
    <div className="flex items-end gap-3">
      <AmountField
        label="Base color"
        optional
        hint="Of what comes out, as #fbefcb."
        name="baseColour"
        inputMode="text"
        className="max-w-32"
        value={colour}
        error={problemAt(problems, 'baseColour')}
        onText={(text) => onColour({ baseColour: text.trim() })}
      />
      <span className="relative grid size-11 place-items-center rounded-action border-[1.5px] border-seam has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-cobalt">
        <FormulaDab colour={known ? colour : null} />
        <label htmlFor={picker} className="sr-only">
          Pick the base color
        </label>
        <input
          id={picker}
          type="color"
          value={known ? colour : '#ffffff'}
          className="absolute inset-0 size-full cursor-pointer opacity-0"
          onChange={(event) => onColour({ baseColour: event.target.value })}
        />
      </span>
    </div>
  );
}

function Keeping({ fields, lead, problems, dispatch }: Props) {
  const set = (change: Partial<EditorFields>) => dispatch({ type: 'fields', fields: change });
  return (
    <Section title="Keeping">
      <div className="flex flex-wrap items-start gap-x-5 gap-y-4">
        <AmountField
          label="Keeps at room"
          hint="8 h, 2 days"
          name="keepsRoomHours"
          inputMode="text"
          value={fields.keepsRoom}
          error={problemAt(problems, 'keepsRoomHours')}
          onText={(keepsRoom) => set({ keepsRoom })}
        />
        <AmountField
          label="chilled"
          hint="5 days"
          name="keepsChilledHours"
          inputMode="text"
          value={fields.keepsChilled}
          error={problemAt(problems, 'keepsChilledHours')}
          onText={(keepsChilled) => set({ keepsChilled })}
        />
        <AmountField
          label="frozen"
          hint="60 days"
          name="keepsFrozenHours"
          inputMode="text"
          value={fields.keepsFrozen}
          error={problemAt(problems, 'keepsFrozenHours')}
          onText={(keepsFrozen) => set({ keepsFrozen })}
        />
        <AmountField
          label="Holds its shape to"
          hint={bothScales(fields.holdsTo, lead) ?? 'For about two hours.'}
          name="holdsToC"
          inputMode="text"
          value={fields.holdsTo}
          error={problemAt(problems, 'holdsToC')}
          onText={(holdsTo) => set({ holdsTo })}
        />
      </div>
      <Checkbox
        label="Needs cold holding"
        name="refrigerate"
        checked={fields.refrigerate}
        onChange={(event) => set({ refrigerate: event.target.checked })}
      />
      {!fields.refrigerate && (
        <Notice
          tone="butter"
          live="polite"
          title="Only by a tested water activity or your authority’s word"
        >
          <p>
            Without either it is held at 41 °F / 5 °C or below (FDA Food Code 3-501.16; 8 °C in the
            UK). Say in the note what it rests on.
          </p>
        </Notice>
      )}
      <Checkbox
        label="Made with pasteurized egg unless somebody decides otherwise"
        hint="Hot syrup poured into eggs is not a measure of the eggs."
        name="pasteurisedByDefault"
        checked={fields.pasteurisedByDefault}
        onChange={(event) => set({ pasteurisedByDefault: event.target.checked })}
      />
    </Section>
  );
}
