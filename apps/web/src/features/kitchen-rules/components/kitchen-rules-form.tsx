import { useCallback, useState } from 'react';
import {
  saveKitchenRules,
  type KitchenRules,
  type KitchenSettings,
} from '#shared/contracts/kitchen-rules.ts';
import type { StudioCard } from '#shared/contracts/menu.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { FormErrorSummary } from '#web/components/ui/form-error-summary.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { ApiProblem } from '#web/lib/http.ts';
import { useSaveKitchenRules } from '../api/save-kitchen-rules.ts';
import type { FigureKind } from '../draft/figure-kinds.ts';
import { ruleGroups } from '../draft/rule-groups.ts';
import { FigureField } from './figure-field.tsx';
import { MonthFields } from './month-fields.tsx';
import { RuleFigure } from './rule-figure.tsx';

type Props = {
  readonly settings: KitchenSettings;
  readonly studio: StudioCard;
  /** The menu goes by the new figures at once. */
  readonly onSaved: () => void;
};

const fields = 'grid grid-cols-1 gap-x-8 gap-y-5 min-[26rem]:grid-cols-2 lg:grid-cols-4';

/** Figures of the studio that the kitchen goes by. */
const places = [
  { name: 'altitudeM', label: 'Height above the sea', kind: 'altitude', unit: '', usual: null },
  {
    name: 'dessertFactorPpm',
    label: 'Eat cake beside other desserts',
    kind: 'share',
    unit: '',
    usual: 700_000,
  },
  {
    name: 'wordsPer100Mm',
    label: 'Letters per 100 mm / 4 in of a tier',
    kind: 'number',
    unit: 'letters',
    usual: 13,
  },
] as const satisfies readonly { name: string; kind: FigureKind; [more: string]: unknown }[];

const labels = new Map<string, string>([
  ...ruleGroups.flatMap((group) =>
    group.fields.map((it): [string, string] => [`rules.${it.name}`, it.label]),
  ),
  ...places.map((it): [string, string] => [it.name, it.label]),
]);

/** The kitchen's figures, saved as a whole; what was typed stays until it is saved. */
export function KitchenRulesForm({ settings, studio, onSaved }: Props) {
  const [draft, setDraft] = useState(settings);
  const [attempt, setAttempt] = useState(0);
  const save = useSaveKitchenRules();
  const toast = useToast();
  const put = (change: Partial<KitchenSettings>) => setDraft((it) => ({ ...it, ...change }));
  const putRule = useCallback(
    (name: keyof KitchenRules, value: number) =>
      setDraft((it) => ({ ...it, rules: { ...it.rules, [name]: value } })),
    [],
  );
  const takeUp = (from: KitchenSettings) => {
    setDraft(from);
    setAttempt(0);
  };

  const overtaken = settings.version !== draft.version;
  const read = saveKitchenRules.safeParse(draft);
  const problems =
    attempt === 0 || read.success
      ? []
      : read.error.issues.map(({ path, message }) => ({
          name: path.map(String).join('.'),
          message,
        }));
  const errorAt = (name: string) => problems.find((it) => it.name === name)?.message;

  const send = () => {
    setAttempt((it) => it + 1);
    if (!read.success || overtaken) return;
    save.mutate(read.data, {
      onSuccess: (saved) => {
        takeUp(saved);
        onSaved();
        toast({ message: 'Saved. Menu, estimates and planner go by it now.' });
      },
    });
  };
  const conflict = save.error instanceof ApiProblem && save.error.code === 'changed-meanwhile';

  return (
    <form
      noValidate
      className="grid gap-10"
      onSubmit={(event) => {
        event.preventDefault();
        send();
      }}
    >
      <FormErrorSummary
        problems={problems.map(({ name, message }) => ({
          name,
          message: `${labels.get(name) ?? 'The warmest hour of a month'}: ${message}`,
        }))}
        attempt={attempt}
        title="Some figures need another look"
      />
      {overtaken && (
        <Notice tone="butter" title="Somebody saved other figures meanwhile" live="polite">
          <p>What you changed is still here. Take up theirs to go on from it.</p>
          <div>
            <Button kind="secondary" onClick={() => takeUp(settings)}>
              Take up theirs
            </Button>
          </div>
        </Notice>
      )}
      <p className="measure text-slate">
        Menu, estimates, proposals and the planner go by these figures as soon as they are saved;
        orders that were sent keep what they were offered. Write a measure in inches, centimeters or
        millimeters, as you like.
      </p>
      <Section title="The warmest hour of each month">
        <p className="measure text-slate">
          What “I don’t know yet” is reckoned with. Your own notebook is the best source.
        </p>
        <MonthFields
          figures={draft.monthlyWarmestC}
          studio={studio}
          errorAt={errorAt}
          onFigures={(monthlyWarmestC) => put({ monthlyWarmestC })}
        />
      </Section>
      <Section title="Place, portions and words">
        <p className="measure text-slate">
          Sugar boils about 2 °F lower for every 1,000 ft up (Colorado State University Extension):
          the bench is shown the target for your height.
        </p>
        <div className={fields}>
          {places.map(({ name, label, kind, unit, usual }) => (
            <FigureField
              key={name}
              name={name}
              label={label}
              kind={kind}
              unit={unit === '' ? undefined : unit}
              value={draft[name]}
              hint={usual === null ? 'In feet or meters' : undefined}
              usual={usual}
              studio={studio}
              error={errorAt(name)}
              onValue={(value) => put({ [name]: value })}
            />
          ))}
        </div>
      </Section>
      {ruleGroups.map((group) => (
        <Section key={group.title} title={group.title}>
          <p className="measure text-slate">{group.about}</p>
          <div className={fields}>
            {group.fields.map((field) => (
              <RuleFigure
                key={field.name}
                field={field}
                value={draft.rules[field.name]}
                studio={studio}
                error={errorAt(`rules.${field.name}`)}
                onRule={putRule}
              />
            ))}
          </div>
        </Section>
      ))}
      <div className="grid gap-3">
        {save.isError && !conflict && <Failure error={save.error} />}
        <div>
          <Button type="submit" pending={save.isPending}>
            Save the figures
          </Button>
        </div>
      </div>
    </form>
  );
}
