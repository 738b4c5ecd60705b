import type { FormulaDraft } from '#shared/contracts/pantry.ts';
import { FormulaLine } from '#api/db/models/formula-line.ts';
import { FormulaStep } from '#api/db/models/formula-step.ts';
import { FormulaVersion } from '#api/db/models/formula-version.ts';
import { Formula } from '#api/db/models/formula.ts';

/** Weights are kept in whole milligrams. */
export const mgOf = (grams: number): number => Math.round(grams * 1000);

/**
 * Writes the next version of a formula, closed from then on: it is the current one. In a
 * transaction.
 * @returns its id
 */
export async function writeVersion(
  formulaId: string,
  draft: FormulaDraft,
  byUserId: string,
): Promise<string> {
  const newest = await FormulaVersion.max<number | null, FormulaVersion>('n', {
    where: { formulaId },
  });
  const { id: versionId } = await FormulaVersion.create({
    formulaId,
    n: (newest ?? 0) + 1,
    yieldPpm: draft.yieldPpm,
    densityMgPerMl: mgOf(draft.densityGPerMl),
    bakeLossPpm: draft.bakeLossPpm,
    baseColourHex: draft.baseColour,
    keepsRoomHours: draft.keepsRoomHours,
    keepsChilledHours: draft.keepsChilledHours,
    keepsFrozenHours: draft.keepsFrozenHours,
    holdsToC: draft.holdsToC,
    refrigerate: draft.refrigerate,
    pasteurisedByDefault: draft.pasteurisedByDefault,
    note: draft.note,
    createdByUserId: byUserId,
  });
  await FormulaLine.bulkCreate(
    draft.lines.map(({ part, grams, asTyped, step }, position) => ({
      versionId,
      position,
      ingredientId: part.kind === 'ingredient' ? part.ingredientId : null,
      formulaVersionId: part.kind === 'formula' ? part.formulaVersionId : null,
      weightMg: mgOf(grams),
      asTyped,
      step,
    })),
  );
  await FormulaStep.bulkCreate(
    draft.steps.map(({ critical, ...step }, position) => ({
      ...step,
      versionId,
      position,
      criticalLimitC: critical?.limitC ?? null,
      criticalSeconds: critical?.seconds ?? null,
      criticalNote: critical?.note ?? null,
    })),
  );
  await Formula.update({ currentVersionId: versionId }, { where: { id: formulaId } });
  return versionId;
}
