import { type CreateFormula, savedFormula } from '#shared/contracts/pantry.ts';
import { request } from '#web/lib/http.ts';
import { usePantryCommand } from './use-pantry-command.ts';

/** A formula and its first version. */
export function createFormula(body: CreateFormula) {
  return request({
    method: 'POST',
    path: '/api/pantry/formulas',
    body,
    answer: savedFormula,
  });
}

export function useCreateFormula() {
  return usePantryCommand(createFormula);
}
