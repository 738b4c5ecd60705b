import { type Dispatch, memo } from 'react';
import { stepResources } from '#shared/contracts/pantry.ts';
import { formatBenchTemperature, type TemperatureLead } from '#shared/kitchen/measures.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { TextArea } from '#web/components/ui/text-area.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import type { FieldProblem } from '#web/lib/forms.ts';
import { AmountField } from '../forms/amount-field.tsx';
import { problemAt } from '../forms/check-draft.ts';
import { degreesOf } from '../forms/read-kitchen.ts';
import { resourceWords } from '../formulas/formula-words.ts';
import type { EditorAction } from './editor-actions.ts';
import type { StepRow } from './editor-form.ts';
import { RowButtons } from './row-buttons.tsx';

type Props = {
  readonly steps: readonly StepRow[];
  readonly lead: TemperatureLead;
  readonly problems: readonly FieldProblem[];
  readonly dispatch: Dispatch<EditorAction>;
};

/** What is done, step by step. */
export const StepFields = memo(function StepFields({ steps, lead, problems, dispatch }: Props) {
  return (
    <div className="grid gap-4">
      {steps.length > 0 && (
        <ol className="border-t border-seam">
          {steps.map((step, at) => (
            <li key={step.key} className="grid gap-3 border-b border-seam py-4">
              <OneStep step={step} at={at} lead={lead} problems={problems} dispatch={dispatch} />
            </li>
          ))}
        </ol>
      )}
      <div>
        <Button kind="secondary" onClick={() => dispatch({ type: 'add-step' })}>
          Add a step
        </Button>
      </div>
    </div>
  );
});

type StepProps = Omit<Props, 'steps'> & { readonly step: StepRow; readonly at: number };

function OneStep({ step, at, lead, problems, dispatch }: StepProps) {
  const name = (field: string) => `steps.${at}.${field}`;
  const error = (field: string) => problemAt(problems, name(field));
  const patch = (change: Partial<StepRow>) =>
    dispatch({ type: 'step', key: step.key, patch: change });
  return (
    <>
      <div className="grid grid-cols-[auto_minmax(0,1fr)] items-center gap-x-3 gap-y-2 sm:grid-cols-[auto_minmax(0,1fr)_auto] sm:items-start">
        <span className="grid sm:mt-7 size-9 shrink-0 place-items-center rounded-action border-[1.5px] border-ink font-display font-semibold tabular-nums">
          {at + 1}
        </span>
        <div className="min-w-0 max-sm:col-span-2 max-sm:row-start-2">
          <TextArea
            label={`Step ${at + 1}`}
            name={name('text')}
            rows={2}
            value={step.text}
            error={error('text')}
            onChange={(event) => patch({ text: event.target.value.replaceAll('\n', ' ') })}
          />
        </div>
        <span className="justify-self-end sm:mt-7">
          <RowButtons
            what={`step ${at + 1}`}
            onUp={() => dispatch({ type: 'move-step', key: step.key, by: -1 })}
            onDown={() => dispatch({ type: 'move-step', key: step.key, by: 1 })}
            onRemove={() => dispatch({ type: 'remove-step', key: step.key })}
          />
        </span>
      </div>
      <div className="grid gap-3 sm:pl-12">
        <div className="flex flex-wrap items-end gap-3">
          <AmountField
            label="Work"
            name={name('activeMinutes')}
            unit="min"
            inputMode="text"
            className="max-w-24 tabular-nums"
            value={step.activeMinutes}
            error={error('activeMinutes')}
            onText={(activeMinutes) => patch({ activeMinutes })}
          />
          <AmountField
            label="Waiting"
            name={name('waitingMinutes')}
            unit="min"
            inputMode="text"
            className="max-w-24 tabular-nums"
            value={step.waitingMinutes}
            error={error('waitingMinutes')}
            onText={(waitingMinutes) => patch({ waitingMinutes })}
          />
          <Select
            label="Where"
            name={name('resource')}
            value={step.resource}
            onChange={(event) => {
              const resource = stepResources.find((it) => it === event.target.value);
              if (resource !== undefined) patch({ resource });
            }}
          >
            {stepResources.map((it) => (
              <option key={it} value={it}>
                {resourceWords[it]}
              </option>
            ))}
          </Select>
        </div>
        <Checkbox
          label="A syrup is boiled"
          checked={step.syrup !== null}
          onChange={(event) => patch({ syrup: event.target.checked ? '' : null })}
        />
        {step.syrup !== null && (
          <AmountField
            label="Boiled to, at sea level"
            hint={
              bothScales(step.syrup, lead) ??
              '240 F, 115 C; the bench is told the mark at your altitude.'
            }
            name={name('syrupTargetC')}
            inputMode="text"
            value={step.syrup}
            error={error('syrupTargetC')}
            onText={(syrup) => patch({ syrup })}
          />
        )}
        <Checkbox
          label="The mix itself is measured, and logged"
          checked={step.limit !== null}
          onChange={(event) =>
            patch({ limit: event.target.checked ? { temperature: '', time: '', note: '' } : null })
          }
        />
        {step.limit !== null && (
          <LimitFields
            limit={step.limit}
            lead={lead}
            name={name}
            error={error}
            onLimit={(limit) => patch({ limit })}
          />
        )}
      </div>
    </>
  );
}

type Limit = NonNullable<StepRow['limit']>;

type LimitProps = {
  readonly limit: Limit;
  readonly lead: TemperatureLead;
  readonly name: (field: string) => string;
  readonly error: (field: string) => string | undefined;
  readonly onLimit: (limit: Limit) => void;
};

function LimitFields({ limit, lead, name, error, onLimit }: LimitProps) {
  return (
    <div className="flex flex-wrap items-end gap-3">
      <AmountField
        label="Limit"
        hint={bothScales(limit.temperature, lead) ?? '160 F, 71 C'}
        name={name('critical.limitC')}
        inputMode="text"
        value={limit.temperature}
        error={error('critical.limitC')}
        onText={(temperature) => onLimit({ ...limit, temperature })}
      />
      <AmountField
        label="Held or reached in"
        optional
        hint="17 s, 40 min, 6 h"
        name={name('critical.seconds')}
        inputMode="text"
        value={limit.time}
        error={error('critical.seconds')}
        onText={(time) => onLimit({ ...limit, time })}
      />
      <div className="min-w-0 grow basis-64">
        <TextField
          label="In words"
          optional
          name={name('critical.note')}
          value={limit.note}
          error={error('critical.note')}
          onChange={(event) => onLimit({ ...limit, note: event.target.value })}
        />
      </div>
    </div>
  );
}

/** What a temperature is understood as, in both scales; null while there is none. */
export function bothScales(text: string, lead: TemperatureLead): string | null {
  const celsius = degreesOf(text, lead);
  return celsius === null || Number.isNaN(celsius) ? null : formatBenchTemperature(celsius, lead);
}
