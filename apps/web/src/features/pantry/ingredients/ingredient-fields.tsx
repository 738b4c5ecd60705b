import {
  eggPart,
  ingredientFamilies,
  ingredientFamily,
  labelFact,
} from '#shared/contracts/pantry.ts';
import type { LabelRegion } from '#shared/contracts/vocabulary.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { TextArea } from '#web/components/ui/text-area.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import type { FieldProblem } from '#web/lib/forms.ts';
import { AmountField } from '../forms/amount-field.tsx';
import { problemAt } from '../forms/check-draft.ts';
import { factStates } from './allergen-rows.ts';
import { AllergenTable } from './allergen-table.tsx';
import type { IngredientForm } from './ingredient-form.ts';
import { eggPartWords, factNames, factWords, familyWords } from './ingredient-words.ts';
import { MeasureTable } from './measure-table.tsx';
import { StateRow } from './state-row.tsx';

type Props = {
  readonly form: IngredientForm;
  readonly region: LabelRegion;
  readonly currency: string;
  readonly today: string;
  /** The label's words were changed, but not the day it was read. */
  readonly readAgain: boolean;
  readonly problems: readonly FieldProblem[];
  readonly onForm: (patch: Partial<IngredientForm>) => void;
};

/** Everything of a bought product, one subject a section. */
export function IngredientFields(props: Props) {
  return (
    <div className="grid gap-10">
      <OnTheShelf {...props} />
      <OnTheLabel {...props} />
      <Section title="Allergens">
        <p className="measure text-sm text-slate">
          As the label says it. What it leaves open is unknown, never “none”; an unknown allergen
          stops orders.
        </p>
        <AllergenTable
          rows={props.form.allergens}
          unnamed={props.form.labelCheckedOn === '' ? 'unknown' : 'not-declared'}
          region={props.region}
          problems={props.problems}
          onRows={(allergens) => props.onForm({ allergens })}
        />
      </Section>
      <AlsoInIt {...props} />
      <ByWeight {...props} />
    </div>
  );
}

function OnTheShelf({ form, currency, problems, onForm }: Props) {
  return (
    <Section title="On the shelf">
      <div className="grid items-end gap-4 sm:grid-cols-2">
        <TextField
          label="Name"
          name="name"
          autoComplete="off"
          value={form.name}
          error={problemAt(problems, 'name')}
          onChange={(event) => onForm({ name: event.target.value })}
        />
        <TextField
          label="Maker"
          optional
          name="brand"
          autoComplete="off"
          value={form.brand}
          error={problemAt(problems, 'brand')}
          onChange={(event) => onForm({ brand: event.target.value })}
        />
        <Select
          label="Family"
          name="family"
          value={form.family}
          onChange={(event) => {
            const family = ingredientFamily.safeParse(event.target.value);
            if (family.success) onForm({ family: family.data });
          }}
        >
          {ingredientFamilies.map((it) => (
            <option key={it} value={it}>
              {familyWords[it]}
            </option>
          ))}
        </Select>
        <div className="grid grid-cols-2 gap-4">
          <AmountField
            label="A pack weighs"
            hint="454 g, 5 lb"
            name="pack.grams"
            inputMode="text"
            value={form.packGrams}
            error={problemAt(problems, 'pack.grams')}
            onText={(packGrams) => onForm({ packGrams })}
          />
          <AmountField
            label="and costs"
            hint="Both empty: unknown"
            name="pack.priceMinor"
            unit={currency}
            value={form.packPrice}
            error={problemAt(problems, 'pack.priceMinor')}
            onText={(packPrice) => onForm({ packPrice })}
          />
        </div>
      </div>
    </Section>
  );
}

function OnTheLabel({ form, today, readAgain, problems, onForm }: Props) {
  return (
    <Section title="On the label">
      <TextField
        label="Common name"
        hint="As an ingredient statement prints it: “butter”, not its brand."
        name="labelName"
        autoComplete="off"
        value={form.labelName}
        error={problemAt(problems, 'labelName')}
        onChange={(event) => onForm({ labelName: event.target.value })}
      />
      <TextArea
        label="Made of"
        optional
        hint="A compound product’s own ingredients, in the label’s order; printed in parentheses."
        name="labelContents"
        rows={2}
        value={form.labelContents}
        error={problemAt(problems, 'labelContents')}
        onChange={(event) => onForm({ labelContents: event.target.value.replaceAll('\n', ' ') })}
      />
      <div className="flex flex-wrap items-end gap-3">
        <TextField
          label="Label read on"
          type="date"
          name="labelCheckedOn"
          max={today}
          className="max-w-48"
          value={form.labelCheckedOn}
          error={problemAt(problems, 'labelCheckedOn')}
          onChange={(event) => onForm({ labelCheckedOn: event.target.value })}
        />
        {form.labelCheckedOn !== today && (
          <Button kind="secondary" onClick={() => onForm({ labelCheckedOn: today })}>
            Read today
          </Button>
        )}
      </div>
      <p className="measure -mt-2 text-sm text-slate">
        Empty while nobody has: everything it does not name is then unknown.
      </p>
      {readAgain && (
        <Notice tone="butter" live="polite" title="You changed what the label says">
          <p>Set the day it was read as well, so that others can tell how fresh this is.</p>
        </Notice>
      )}
    </Section>
  );
}

function AlsoInIt({ form, onForm }: Props) {
  return (
    <Section title="Also in it">
      <p className="measure text-sm text-slate">
        For diets, infants and those who keep from alcohol. Gelatin of unknown origin counts as from
        slaughter.
      </p>
      <div className="border-t border-seam">
        {factNames.map((fact) => (
          <StateRow
            key={fact}
            legend={factWords[fact]}
            value={form[fact]}
            options={factStates}
            onValue={(value) => onForm({ [fact]: value })}
          />
        ))}
      </div>
      <div className="grid items-end gap-4 sm:grid-cols-2">
        <Select
          label="Egg"
          hint="Counts in the plan of eggs to crack."
          name="eggPart"
          value={form.eggPart ?? ''}
          onChange={(event) => {
            const part = eggPart.safeParse(event.target.value);
            onForm({ eggPart: part.success ? part.data : null });
          }}
        >
          <option value="">Not an egg</option>
          {eggPart.options.map((it) => (
            <option key={it} value={it}>
              {eggPartWords[it]}
            </option>
          ))}
        </Select>
        {form.eggPart !== null && (
          <Select
            label="Pasteurized"
            hint="Unknown counts as raw."
            name="pasteurised"
            value={form.pasteurised}
            onChange={(event) => {
              const fact = labelFact.safeParse(event.target.value);
              if (fact.success) onForm({ pasteurised: fact.data });
            }}
          >
            {labelFact.options.map((it) => (
              <option key={it} value={it}>
                {it}
              </option>
            ))}
          </Select>
        )}
      </div>
    </Section>
  );
}

function ByWeight({ form, problems, onForm }: Props) {
  return (
    <Section title="By weight">
      <div className="grid gap-4 sm:grid-cols-2">
        <AmountField
          label="Weighed to"
          hint="0.1 g for salt, 1 or 5 g for the rest; an egg’s own weight comes by its part."
          name="roundingG"
          unit="g"
          value={form.rounding}
          error={problemAt(problems, 'roundingG')}
          onText={(rounding) => onForm({ rounding })}
        />
        <AmountField
          label="Density"
          optional
          hint="For volumes without a weight of their own below."
          name="densityGPerMl"
          unit="g/mL"
          value={form.density}
          error={problemAt(problems, 'densityGPerMl')}
          onText={(density) => onForm({ density })}
        />
      </div>
      <h3 className="mt-2">Household measures</h3>
      <p className="measure -mt-2 text-sm text-slate">
        Weigh one of each: 16 tablespoons of powdered sugar are not a cup by weight. Say sifted,
        packed or soft under “How”.
      </p>
      <MeasureTable
        rows={form.measures}
        problems={problems}
        onRows={(measures) => onForm({ measures })}
      />
    </Section>
  );
}
