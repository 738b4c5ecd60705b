import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import {
  type FormulaVersion,
  type SavedFormula,
  formulaKind,
  formulaKinds,
  formulaVersion,
} from '#shared/contracts/pantry.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { ChipChoices } from '#web/components/ui/chips.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { FormErrorSummary } from '#web/components/ui/form-error-summary.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { paths } from '#web/config/paths.ts';
import type { FieldProblem } from '#web/lib/forms.ts';
import { ApiProblem } from '#web/lib/http.ts';
import { useCreateFormula } from '../api/create-formula.ts';
import { useSaveFormula } from '../api/save-formula.ts';
import { gramsText } from '#web/lib/grams-text.ts';
import { kindWords } from '../formulas/formula-words.ts';
import { problemAt, serverProblems } from '../forms/check-draft.ts';
import { KeptOffer } from '../forms/kept-offer.tsx';
import { LeaveGuard } from '../forms/leave-guard.tsx';
import type { House } from '../house.ts';
import type { KeptFormula, Shelf } from '../shelf.ts';
import { formOfVersion } from './editor-form.ts';
import { FormulaConflict } from './formula-conflict.tsx';
import { inspectForm } from './inspect-form.ts';
import { LineList } from './line-list.tsx';
import { LiveAside } from './live-aside.tsx';
import { liveProblems } from './live-problems.ts';
import { PropertyFields } from './property-fields.tsx';
import { StepFields } from './step-fields.tsx';
import { onTheForm, typedFormula } from './typed-formula.ts';
import { useFormulaEditor } from './use-formula-editor.ts';
import { useSteadyProblems } from './use-steady-problems.ts';

type Props = {
  /** The formula whose next version is written; null for a new one. */
  readonly kept: KeptFormula | null;
  /** The version it begins from. */
  readonly from: FormulaVersion | null;
  readonly shelf: Shelf;
  readonly house: House;
};

/** Writes the next version of a formula, or a new formula. */
export function FormulaEditor({ kept, from, shelf, house }: Props) {
  const navigate = useNavigate();
  const toast = useToast();
  const editor = useFormulaEditor({ kept, from, shelf, house });
  const { form, dispatch, base, setBase, inspected, unsaved, draft } = editor;
  const create = useCreateFormula();
  const save = useSaveFormula();
  const [attempt, setAttempt] = useState(0);
  const [refused, setRefused] = useState<readonly FieldProblem[]>([]);
  const [failure, setFailure] = useState<unknown>(null);
  const [theirs, setTheirs] = useState<FormulaVersion | null>(null);
  const holders = kept === null ? [] : shelf.formulasUsing(kept.formula.id);
  const [leftOut, setLeftOut] = useState<readonly string[]>([]);
  const [inOrders, setInOrders] = useState(false);
  const lead = house.temperatureLead;

  const problems = useSteadyProblems([
    ...liveProblems(inspected.problems, form, attempt > 0),
    ...refused,
  ]);

  const onSaved = ({ formula, version, carried, touched }: SavedFormula) => {
    draft.clear();
    toast({
      message:
        carried.length === 0
          ? `${formula.name}, version ${version.n}, is saved.`
          : `${formula.name}, version ${version.n}, is saved and carried into ${carried.length === 1 ? 'one formula' : `${carried.length} formulas`}.`,
    });
    void navigate(paths.staffFormula(formula.id), { replace: true, state: { touched } });
  };
  const onRefused = (error: unknown) => {
    const { keys } = typedFormula(form, shelf.index, lead);
    const placed = onTheForm(serverProblems(error), form, keys);
    setRefused(placed);
    if (error instanceof ApiProblem && error.code === 'changed-meanwhile') {
      const current = formulaVersion.safeParse(error.facts['current']);
      if (current.success && current.data.id !== base?.id) {
        setTheirs(current.data);
        return;
      }
    }
    if (placed.length === 0) setFailure(error);
  };
  const submit = () => {
    setAttempt((now) => now + 1);
    setRefused([]);
    setFailure(null);
    // Of what stands there now: the deferred look may be a letter behind.
    const now = inspectForm(form, {
      shelf,
      formulaId: kept?.formula.id ?? null,
      against: null,
      percentOf: null,
      house,
    });
    if (now.draft === null) return;
    const { name, kind } = form.fields;
    if (kept === null || base === null) {
      create.mutate({ kind, name, draft: now.draft }, { onSuccess: onSaved, onError: onRefused });
      return;
    }
    save.mutate(
      {
        id: kept.formula.id,
        basedOn: base.id,
        name,
        draft: now.draft,
        carryInto: holders.map((it) => it.id).filter((it) => !leftOut.includes(it)),
        inOpenOrders: inOrders,
      },
      { onSuccess: onSaved, onError: onRefused },
    );
  };

  const found = draft.found;
  const copied = from === null ? undefined : shelf.formulas.get(from.formulaId)?.formula.name;
  return (
    <div className="grid items-start gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,1fr)_22rem]">
      <LeaveGuard unsaved={unsaved && !save.isSuccess && !create.isSuccess} kept={draft.kept} />
      {theirs !== null && base !== null && inspected.draft !== null && (
        <FormulaConflict
          base={base}
          theirs={theirs}
          mine={inspected.draft}
          shelf={shelf}
          house={house}
          onMine={() => {
            setBase(theirs);
            setTheirs(null);
          }}
          onTheirs={() => {
            dispatch({
              type: 'all',
              form: formOfVersion(theirs, form.fields, shelf.index, lead),
            });
            setBase(theirs);
            setTheirs(null);
            draft.clear();
          }}
          onClose={() => setTheirs(null)}
        />
      )}
      <form
        noValidate
        className="grid min-w-0 gap-5"
        onSubmit={(event) => {
          event.preventDefault();
          submit();
        }}
      >
        {found !== null && (
          <KeptOffer
            savedAt={found.savedAt}
            house={house}
            onTake={() => {
              dispatch({ type: 'all', form: found.values });
              const begun =
                found.basedOn === null ? undefined : shelf.index.versions.get(found.basedOn);
              if (begun !== undefined) setBase(begun);
              draft.settle(false);
            }}
            onDrop={() => draft.settle(true)}
          />
        )}
        <FormErrorSummary problems={attempt > 0 ? problems : []} attempt={attempt} />
        {failure !== null && <Failure error={failure} />}
        <Rim label="The formula" className="grid gap-10 p-4 sm:p-7">
          <div className="grid items-start gap-4 sm:grid-cols-[minmax(0,1fr)_14rem]">
            <TextField
              label="Name"
              name="name"
              autoComplete="off"
              value={form.fields.name}
              error={problemAt(problems, 'name')}
              onChange={(event) =>
                dispatch({ type: 'fields', fields: { name: event.target.value } })
              }
            />
            {kept === null && (
              <Select
                label="Kind"
                name="kind"
                value={form.fields.kind}
                onChange={(event) => {
                  const kind = formulaKind.safeParse(event.target.value);
                  if (kind.success) dispatch({ type: 'fields', fields: { kind: kind.data } });
                }}
              >
                {formulaKinds.map((it) => (
                  <option key={it} value={it}>
                    {kindWords[it]}
                  </option>
                ))}
              </Select>
            )}
          </div>
          <Section title="What goes in">
            <p className="measure -mt-2 text-sm text-slate">
              As you would write it down: “340 g milk”, “1 1/2 cups milk, 340 g”, “1 lb butter”,
              “600 g Vanilla custard”.
            </p>
            <LineList
              lines={form.lines}
              steps={form.steps.length}
              index={shelf.index}
              locale={house.locale}
              problems={problems}
              percents={editor.percent.of === null ? inspected.shares : inspected.percents}
              dispatch={dispatch}
            />
          </Section>
          <Section title="Steps">
            <StepFields steps={form.steps} lead={lead} problems={problems} dispatch={dispatch} />
          </Section>
          <PropertyFields
            fields={form.fields}
            lead={lead}
            problems={problems}
            dispatch={dispatch}
          />
          {kept !== null && (
            <Section title="Where it goes">
              {holders.length > 0 && (
                <ChipChoices
                  legend="Formulas that hold it take the new version too"
                  hint="Each gets a next version of its own; one left out stays as it is."
                  value={holders.map((it) => it.id).filter((it) => !leftOut.includes(it))}
                  onValue={(chosen) =>
                    setLeftOut(holders.map((it) => it.id).filter((it) => !chosen.includes(it)))
                  }
                  chips={holders.map(({ id, name }) => ({ value: id, label: name }))}
                />
              )}
              <Checkbox
                label="Open orders that are not ready yet are made by it as well"
                hint="A substitution: what they contain is worked out again, and customers are told where it differs. Without it they keep the version they were ordered with."
                checked={inOrders}
                onChange={(event) => setInOrders(event.target.checked)}
              />
            </Section>
          )}
        </Rim>
        <div className="sticky bottom-0 z-10 -mx-4 flex flex-wrap items-center gap-x-4 gap-y-2 border-t border-seam bg-enamel px-4 py-3">
          <Button type="submit" pending={save.isPending || create.isPending}>
            {base === null ? 'Save the formula' : `Save version ${base.n + 1}`}
          </Button>
          <p className="font-display text-lg font-semibold tabular-nums lg:hidden">
            {gramsText(inspected.seen.totals.outG, house.locale)}
          </p>
          {unsaved && (
            <p className="text-sm text-slate">
              {draft.kept ? 'Not saved yet; kept on this device.' : 'Not saved yet.'}
            </p>
          )}
        </div>
      </form>
      <LiveAside
        inspected={inspected}
        shelf={shelf}
        house={house}
        percent={editor.percent}
        against={base !== null ? `version ${base.n}` : copied !== undefined ? `${copied}` : null}
      />
    </div>
  );
}
