import { type SaveIngredient, savedIngredient } from '#shared/contracts/pantry.ts';
import { request } from '#web/lib/http.ts';
import { usePantryCommand } from './use-pantry-command.ts';

type Saved = SaveIngredient & {
  /** Null for a new one. */
  readonly id: string | null;
};

/** A bought product as its label now reads, or a new one on the shelf. */
export function saveIngredient({ id, ...body }: Saved) {
  return request({
    method: id === null ? 'POST' : 'PUT',
    path:
      id === null ? '/api/pantry/ingredients' : `/api/pantry/ingredients/${encodeURIComponent(id)}`,
    body,
    answer: savedIngredient,
  });
}

export function useSaveIngredient() {
  return usePantryCommand(saveIngredient);
}
