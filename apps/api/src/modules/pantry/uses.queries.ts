import type { UsedBy } from '#shared/contracts/pantry.ts';
import { ingredientIdsIn, kitchenBook } from '#shared/kitchen/kitchen-book.ts';
import { formatList } from '#shared/dates/format.ts';
import { ButtercreamStyle } from '#api/db/models/buttercream-style.ts';
import { Covering } from '#api/db/models/covering.ts';
import { DecorationIngredient } from '#api/db/models/decoration-ingredient.ts';
import { Decoration } from '#api/db/models/decoration.ts';
import { Filling } from '#api/db/models/filling.ts';
import { Sponge } from '#api/db/models/sponge.ts';
import { AppError } from '#api/platform/app-error.ts';
import type { WholePantry } from './load-pantry.queries.ts';

/** What the menu sells that is made with a formula, and the formulas in use that hold it. */
export async function usesOfFormula(pantry: WholePantry, formulaId: string): Promise<UsedBy[]> {
  const where = { formulaId, archivedAt: null };
  const [sponges, fillings, styles, coverings, decorations] = await Promise.all([
    Sponge.findAll({ where }),
    Filling.findAll({ where }),
    ButtercreamStyle.findAll({ where }),
    Covering.findAll({ where }),
    Decoration.findAll({ where }),
  ]);
  const own = new Set(
    pantry.versions.filter((it) => it.formulaId === formulaId).map(({ id }) => id),
  );
  const current = new Map(pantry.versions.map((it) => [it.id, it]));
  const holders = pantry.formulas.filter(
    (it) =>
      it.archivedAt === null &&
      it.id !== formulaId &&
      current
        .get(it.currentVersionId)
        ?.lines.some(({ part }) => part.kind === 'formula' && own.has(part.formulaVersionId)),
  );
  return [
    ...sponges.map(named('sponge')),
    ...fillings.map(named('filling')),
    ...styles.map(named('style')),
    ...coverings.map(named('covering')),
    ...decorations.map(named('decoration')),
    ...holders.map(named('formula')),
  ];
}

/** The formulas in use that hold an ingredient, however deep, and the decorations made with it. */
export async function usesOfIngredient(
  pantry: WholePantry,
  ingredientId: string,
): Promise<UsedBy[]> {
  const book = kitchenBook(pantry);
  const holders = pantry.formulas.filter(
    (it) =>
      it.archivedAt === null && ingredientIdsIn(book.node(it.currentVersionId)).has(ingredientId),
  );
  const rows = await DecorationIngredient.findAll({ where: { ingredientId } });
  const decorations = await Decoration.findAll({
    where: { id: rows.map(({ decorationId }) => decorationId), archivedAt: null },
  });
  return [...holders.map(named('formula')), ...decorations.map(named('decoration'))];
}

type Named = { readonly id: string; readonly name: string };

const named =
  (kind: UsedBy['kind']) =>
  ({ id, name }: Named): UsedBy => ({ kind, id, name });

/** @throws `still-used`, naming what uses it, where something does */
export function refuseUsed(name: string, uses: readonly UsedBy[]): void {
  if (uses.length === 0) return;
  throw new AppError('still-used', {
    detail: `${name} is still used by ${formatList(uses.map((it) => it.name))}.`,
    facts: { usedBy: uses },
  });
}
