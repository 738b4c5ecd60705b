import { type SaveFormula, savedFormula } from '#shared/contracts/pantry.ts';
import { request } from '#web/lib/http.ts';
import { usePantryCommand } from './use-pantry-command.ts';

type Saved = SaveFormula & { readonly id: string };

/** The next version of a formula; refused where another one was made meanwhile. */
export function saveFormula({ id, ...body }: Saved) {
  return request({
    method: 'POST',
    path: `/api/pantry/formulas/${encodeURIComponent(id)}/versions`,
    body,
    answer: savedFormula,
  });
}

export function useSaveFormula() {
  return usePantryCommand(saveFormula);
}
