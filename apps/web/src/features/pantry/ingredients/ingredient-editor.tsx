import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { Formula, Ingredient, IngredientDraft } from '#shared/contracts/pantry.ts';
import { ingredient as ingredientContract, ingredientDraft } from '#shared/contracts/pantry.ts';
import { today as todayIn } from '#shared/dates/local-time.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { FormErrorSummary } from '#web/components/ui/form-error-summary.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { paths } from '#web/config/paths.ts';
import type { FieldProblem } from '#web/lib/forms.ts';
import { ApiProblem } from '#web/lib/http.ts';
import { useSaveIngredient } from '../api/save-ingredient.ts';
import { TouchedOrders } from '../components/touched-orders.tsx';
import { checkDraft, serverProblems } from '../forms/check-draft.ts';
import { KeptOffer } from '../forms/kept-offer.tsx';
import { LeaveGuard } from '../forms/leave-guard.tsx';
import { useKeptDraft } from '../forms/use-kept-draft.ts';
import type { House } from '../house.ts';
import { IngredientAside } from './ingredient-aside.tsx';
import { IngredientConflict } from './ingredient-conflict.tsx';
import { IngredientFields } from './ingredient-fields.tsx';
import {
  type IngredientForm,
  differingFields,
  draftOf,
  emptyIngredient,
  formOf,
  ingredientForm,
  joinDrafts,
  readBase,
  typedDraft,
} from './ingredient-form.ts';

type Props = {
  /** Null for a new one. */
  readonly ingredient: Ingredient | null;
  readonly usedIn: readonly Formula[];
  readonly house: House;
  readonly currency: string;
};

/** What a label says is the label's day; these changed want it read again. */
const labelFields = ['labelName', 'labelContents', 'allergens'] as const;

/** A bought product and all that is known of it. */
export function IngredientEditor({ ingredient, usedIn, house, currency }: Props) {
  const navigate = useNavigate();
  const toast = useToast();
  const save = useSaveIngredient();
  const [base, setBase] = useState<IngredientDraft | null>(() =>
    ingredient === null ? null : draftOf(ingredient),
  );
  const start = base === null ? emptyIngredient : formOf(base, currency);
  const [form, setForm] = useState<IngredientForm>(start);
  const [refused, setRefused] = useState<readonly FieldProblem[]>([]);
  const [attempt, setAttempt] = useState(0);
  const [failure, setFailure] = useState<unknown>(null);
  const [theirs, setTheirs] = useState<IngredientDraft | null>(null);
  const [touched, setTouched] = useState<readonly number[]>([]);
  const today = todayIn(new Date(), house.zone);

  const unsaved = JSON.stringify(form) !== JSON.stringify(start);
  const draft = useKeptDraft({
    key: `ingredient:${ingredient?.id ?? 'new'}`,
    contract: ingredientForm,
    values: form,
    basedOn: base === null ? null : JSON.stringify(base),
    unsaved,
  });

  const onForm = (patch: Partial<IngredientForm>) => setForm((now) => ({ ...now, ...patch }));
  const mine = checkDraft(ingredientDraft, typedDraft(form, currency));
  // Each goes as its field is typed in again; the server's stay until it is asked again.
  const problems = attempt === 0 ? [] : mine.ok ? refused : mine.problems;
  const changedLabel =
    base !== null &&
    mine.ok &&
    differingFields(base, mine.value).some((it) => labelFields.some((field) => field === it)) &&
    base.labelCheckedOn === mine.value.labelCheckedOn;

  const submit = () => {
    setAttempt((now) => now + 1);
    setFailure(null);
    setRefused([]);
    if (!mine.ok) return;
    save.mutate(
      { id: ingredient?.id ?? null, basedOn: base, draft: mine.value },
      {
        onSuccess: (saved) => {
          draft.clear();
          const now = draftOf(saved.ingredient);
          setBase(now);
          setForm(formOf(now, currency));
          setTouched(saved.touched);
          toast({ message: `${saved.ingredient.name} is saved.` });
          if (ingredient === null) {
            void navigate(paths.staffIngredient(saved.ingredient.id), { replace: true });
          }
        },
        onError: (error) => {
          const placed = serverProblems(error);
          setRefused(placed);
          if (error instanceof ApiProblem && error.code === 'changed-meanwhile') {
            const current = ingredientContract.safeParse(error.facts['current']);
            if (current.success) {
              setTheirs(draftOf(current.data));
              return;
            }
          }
          if (placed.length === 0) setFailure(error);
        },
      },
    );
  };

  const found = draft.found;
  return (
    <div className="grid items-start gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,1fr)_20rem]">
      <LeaveGuard unsaved={unsaved} kept={draft.kept} />
      {theirs !== null && base !== null && mine.ok && (
        <IngredientConflict
          base={base}
          theirs={theirs}
          mine={mine.value}
          region={house.labelRegion}
          locale={house.locale}
          currency={currency}
          onJoin={() => {
            setForm(formOf(joinDrafts(base, theirs, mine.value), currency));
            setBase(theirs);
            setTheirs(null);
          }}
          onTheirs={() => {
            setForm(formOf(theirs, currency));
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
        {touched.length > 0 && <TouchedOrders numbers={touched} />}
        {found !== null && (
          <KeptOffer
            savedAt={found.savedAt}
            house={house}
            onTake={() => {
              setForm(found.values);
              // Its own beginning comes with it: what others saved since must not be undone unseen.
              const begun = readBase(found.basedOn);
              if (begun !== null && base !== null) setBase(begun);
              draft.settle(false);
            }}
            onDrop={() => draft.settle(true)}
          />
        )}
        <FormErrorSummary problems={problems} attempt={attempt} />
        {failure !== null && <Failure error={failure} />}
        <Rim label="The ingredient">
          <IngredientFields
            form={form}
            region={house.labelRegion}
            currency={currency}
            today={today}
            readAgain={changedLabel}
            problems={problems}
            onForm={onForm}
          />
        </Rim>
        <div className="sticky bottom-0 z-10 -mx-4 flex flex-wrap items-center gap-x-4 gap-y-2 border-t border-seam bg-enamel px-4 py-3">
          <Button type="submit" pending={save.isPending}>
            {ingredient === null ? 'Put it on the shelf' : 'Save'}
          </Button>
          {unsaved && (
            <p className="text-sm text-slate">
              {draft.kept ? 'Not saved yet; kept on this device.' : 'Not saved yet.'}
            </p>
          )}
        </div>
      </form>
      <IngredientAside
        draft={mine.ok ? mine.value : null}
        usedIn={usedIn}
        house={house}
        currency={currency}
      />
    </div>
  );
}
