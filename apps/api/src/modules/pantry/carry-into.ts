import type { FormulaPart, FormulaVersion } from '#shared/contracts/pantry.ts';
import { indexPantry } from '#shared/kitchen/formulas/pantry-index.ts';
import { AppError } from '#api/platform/app-error.ts';
import type { WholePantry } from './load-pantry.queries.ts';
import { writeVersion } from './write-version.ts';

/**
 * Gives each of some formulas a next version that is the same but for the newest versions inside,
 * those inside others first. `newest` is added to, by formula.
 * @returns the ids of the new versions
 * @throws `invalid-input` naming a formula that holds none of them, or is put away
 */
export async function carryInto(
  formulaIds: readonly string[],
  newest: Map<string, string>,
  pantry: WholePantry,
  byUserId: string,
): Promise<string[]> {
  const index = indexPantry(pantry);
  const waiting = new Set(formulaIds.filter((id) => !newest.has(id)));
  const made: string[] = [];
  const current = (id: string): FormulaVersion | undefined =>
    index.versions.get(index.formulas.get(id)?.currentVersionId ?? '');
  /** Formulas a version holds straight. */
  const heldBy = (version: FormulaVersion): string[] =>
    version.lines.flatMap(({ part }) =>
      part.kind === 'formula' ? (index.versions.get(part.formulaVersionId)?.formulaId ?? []) : [],
    );
  while (waiting.size > 0) {
    // One whose insides are still waiting comes after them.
    const next = [...waiting].find((id) => {
      const version = current(id);
      if (version === undefined || index.formulas.get(id)?.archivedAt !== null) return false;
      const held = heldBy(version);
      return held.some((it) => newest.has(it)) && !held.some((it) => waiting.has(it));
    });
    const version = next === undefined ? undefined : current(next);
    if (next === undefined || version === undefined) throw holdsNone(formulaIds, waiting);
    waiting.delete(next);
    const lines = version.lines.map((line) => {
      if (line.part.kind === 'ingredient') return line;
      const inside = index.versions.get(line.part.formulaVersionId)?.formulaId ?? '';
      const formulaVersionId = newest.get(inside) ?? line.part.formulaVersionId;
      return { ...line, part: { kind: 'formula' as const, formulaVersionId } };
    });
    if (lines.every(({ part }, at) => isSamePart(part, version.lines[at]?.part))) {
      // It holds the newest already; there is nothing new to say of it.
      newest.set(next, version.id);
      continue;
    }
    const versionId = await writeVersion(next, { ...version, lines }, byUserId);
    newest.set(next, versionId);
    made.push(versionId);
  }
  return made;
}

const isSamePart = (one: FormulaPart, other: FormulaPart | undefined): boolean =>
  one.kind !== 'formula' ||
  (other?.kind === 'formula' && other.formulaVersionId === one.formulaVersionId);

function holdsNone(formulaIds: readonly string[], waiting: ReadonlySet<string>): AppError {
  return new AppError('invalid-input', {
    issues: formulaIds.flatMap((id, at) =>
      waiting.has(id)
        ? [{ path: ['carryInto', at], message: 'This formula does not hold the one you save.' }]
        : [],
    ),
  });
}
