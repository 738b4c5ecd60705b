import type { Formula as FormulaView } from '#shared/contracts/pantry.ts';
import { indexPantry, resolvePart } from '#shared/kitchen/formulas/pantry-index.ts';
import { formatList } from '#shared/dates/format.ts';
import { noteCatalogueChange } from '#api/db/plan-versions.ts';
import { Formula } from '#api/db/models/formula.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import type { Staff } from '#api/platform/actor.ts';
import { invalidField } from '#api/platform/app-error.ts';
import { formulaIn, refuseTakenName, versionIn } from './find-in-pantry.ts';
import { currentPantry } from './load-pantry.queries.ts';
import { refuseUsed, usesOfFormula } from './uses.queries.ts';

/**
 * Puts a formula away; orders made with it keep it. Doing so twice is doing so once.
 * @throws `still-used` while the menu sells something made with it or a formula in use holds it
 */
export async function archiveFormula(
  { clock }: Pick<Deps, 'clock'>,
  actor: Staff,
  id: string,
): Promise<FormulaView> {
  return inTransaction(async () => {
    const pantry = await currentPantry();
    const formula = formulaIn(pantry, id);
    if (formula.archivedAt !== null) return formula;
    refuseUsed(formula.name, await usesOfFormula(pantry, id));
    return keep(actor, id, clock.now());
  });
}

/**
 * Brings a formula back into use.
 * @throws `invalid-input` while something in it is put away, or its name is taken
 */
export async function restoreFormula(actor: Staff, id: string): Promise<FormulaView> {
  return inTransaction(async () => {
    const pantry = await currentPantry();
    const formula = formulaIn(pantry, id);
    if (formula.archivedAt === null) return formula;
    refuseTakenName(pantry, formula.name, id);
    const index = indexPantry(pantry);
    const away = versionIn(pantry, formula.currentVersionId).lines.flatMap(({ part }) => {
      const found = resolvePart(index, part);
      if (found.kind === 'missing') return [];
      const { archivedAt } =
        found.kind === 'ingredient' ? found.ingredient : (found.formula ?? formula);
      return archivedAt === null ? [] : [found.name];
    });
    if (away.length > 0) {
      throw invalidField([], `Bring back first what is in it: ${formatList([...new Set(away)])}.`);
    }
    return keep(actor, id, null);
  });
}

async function keep(actor: Staff, id: string, archivedAt: Date | null): Promise<FormulaView> {
  await Formula.update({ archivedAt }, { where: { id } });
  await noteAudit(actor, {
    action: archivedAt === null ? 'restore-formula' : 'archive-formula',
    subjectKind: 'formula',
    subjectId: id,
  });
  await noteCatalogueChange();
  return formulaIn(await currentPantry(), id);
}
