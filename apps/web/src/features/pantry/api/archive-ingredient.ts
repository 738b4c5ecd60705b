import { ingredient } from '#shared/contracts/pantry.ts';
import { request } from '#web/lib/http.ts';
import { usePantryCommand } from './use-pantry-command.ts';

type Archived = { readonly id: string; readonly archived: boolean };

/** Takes a product off the shelf, or puts it back; nothing made with it changes. */
export function archiveIngredient({ id, archived }: Archived) {
  return request({
    method: 'POST',
    path: `/api/pantry/ingredients/${encodeURIComponent(id)}/${archived ? 'archive' : 'restore'}`,
    answer: ingredient,
  });
}

export function useArchiveIngredient() {
  return usePantryCommand(archiveIngredient);
}
