import { formula } from '#shared/contracts/pantry.ts';
import { request } from '#web/lib/http.ts';
import { usePantryCommand } from './use-pantry-command.ts';

type Archived = { readonly id: string; readonly archived: boolean };

/** Takes a formula out of use, or back in; orders keep the versions they were made with. */
export function archiveFormula({ id, archived }: Archived) {
  return request({
    method: 'POST',
    path: `/api/pantry/formulas/${encodeURIComponent(id)}/${archived ? 'archive' : 'restore'}`,
    answer: formula,
  });
}

export function useArchiveFormula() {
  return usePantryCommand(archiveFormula);
}
