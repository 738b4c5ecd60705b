import { indexPantry } from '#shared/kitchen/formulas/pantry-index.ts';
import { RevisionFormulaVersion } from '#api/db/models/revision-formula-version.ts';
import type { OpenOrder } from '#api/modules/contents/open-orders.queries.ts';
import type { WholePantry } from './load-pantry.queries.ts';

/**
 * Lets open orders be made with the newest versions of some formulas instead of those they were
 * ordered with. A cake that is ready is made already and keeps what is in it.
 * @returns how many orders
 */
export async function substituteInOrders(
  newest: ReadonlyMap<string, string>,
  pantry: WholePantry,
  open: ReadonlyMap<string, OpenOrder>,
): Promise<number> {
  const index = indexPantry(pantry);
  const unmade = [...open.values()].filter(({ order }) => order.status !== 'ready');
  const revisionIds = unmade.map(({ revision }) => revision.id);
  const kept = await RevisionFormulaVersion.findAll({ where: { revisionId: revisionIds } });
  const changed = new Set<string>();
  for (const row of kept) {
    const formulaId = index.versions.get(row.formulaVersionId)?.formulaId ?? '';
    const formulaVersionId = newest.get(formulaId);
    if (formulaVersionId === undefined || formulaVersionId === row.formulaVersionId) continue;
    const { revisionId } = row;
    await row.destroy();
    await RevisionFormulaVersion.create({ revisionId, formulaVersionId });
    changed.add(revisionId);
  }
  return changed.size;
}
