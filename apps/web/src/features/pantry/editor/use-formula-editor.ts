import { useDeferredValue, useMemo, useReducer, useState } from 'react';
import type { FormulaVersion } from '#shared/contracts/pantry.ts';
import { useKeptDraft } from '../forms/use-kept-draft.ts';
import { percentChoices } from '../formulas/percent-choice.ts';
import type { House } from '../house.ts';
import type { KeptFormula, Shelf } from '../shelf.ts';
import { editorReducer } from './editor-actions.ts';
import { editorForm, emptyForm, formOfVersion } from './editor-form.ts';
import { inspectForm } from './inspect-form.ts';

type Options = {
  /** Null for a new formula. */
  readonly kept: KeptFormula | null;
  /** The version it begins from. */
  readonly from: FormulaVersion | null;
  readonly shelf: Shelf;
  readonly house: House;
};

/** The editor's state: what is typed, what follows from it, and what the device keeps of it. */
export function useFormulaEditor({ kept, from, shelf, house }: Options) {
  const lead = house.temperatureLead;
  const [start] = useState(() => {
    if (from === null) return emptyForm;
    const copied = shelf.formulas.get(from.formulaId)?.formula;
    return formOfVersion(
      from,
      {
        name: kept?.formula.name ?? (copied === undefined ? '' : `${copied.name}, a copy`),
        kind: kept?.formula.kind ?? copied?.kind ?? 'other',
      },
      shelf.index,
      lead,
    );
  });
  const [form, dispatch] = useReducer(editorReducer, start);
  const [base, setBase] = useState<FormulaVersion | null>(kept?.current ?? null);
  const [percentOf, setPercentOf] = useState<string | null>(null);

  // What follows is worked out after the letter has appeared, so that typing never waits for it.
  const typed = useDeferredValue(form);
  const inspected = useMemo(
    () =>
      inspectForm(typed, {
        shelf,
        formulaId: kept?.formula.id ?? null,
        against: base ?? from,
        percentOf,
        house,
      }),
    [typed, shelf, kept, base, from, percentOf, house],
  );
  const choices = useMemo(() => percentChoices(inspected, shelf.index), [inspected, shelf]);

  const unsaved = form !== start;
  const draft = useKeptDraft({
    key: `formula:${kept?.formula.id ?? 'new'}`,
    contract: editorForm,
    values: form,
    basedOn: base?.id ?? null,
    unsaved,
  });
  return {
    form,
    dispatch,
    base,
    setBase,
    inspected,
    percent: { of: percentOf, choices, onOf: setPercentOf },
    unsaved,
    draft,
  };
}
