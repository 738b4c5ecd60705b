import type { Ingredient } from '#shared/contracts/pantry.ts';
import type { LocalDate } from '#shared/dates/local-time.ts';
import type { FormulaNeed, KitchenNeeds } from './kitchen-needs.ts';

/** When a formula is made: a day and its part of the whole, the parts adding up to 1. */
export type MakingDay = { readonly date: LocalDate; readonly share: number };

/** Weight of one bought thing that goes into a formula on a day. */
export type DatedNeed = {
  readonly date: LocalDate;
  /** Null for what decorations are made of. */
  readonly formula: { readonly id: string; readonly name: string } | null;
  readonly ingredient: Ingredient;
  readonly grams: number;
};

/**
 * An order's needs by the days they are weighed out. `daysOf` tells when a formula is made, empty
 * where the plan does not say: it is then made with the formula it goes into, else on `otherwise`,
 * which also is the day of the decorations.
 */
export function datedNeeds(
  needs: KitchenNeeds,
  daysOf: (formulaId: string) => readonly MakingDay[],
  otherwise: LocalDate,
): DatedNeed[] {
  const days = new Map<string, readonly MakingDay[]>();
  // What is inside others is listed before them, so from the end the outer ones come first.
  for (const need of needs.formulas.toReversed()) {
    const own = daysOf(need.version.formulaId);
    const outer = needs.formulas.find((it) => holds(it, need.version.id));
    const inherited = outer === undefined ? undefined : days.get(outer.version.id);
    const found = own.length > 0 ? own : (inherited ?? [{ date: otherwise, share: 1 }]);
    days.set(need.version.id, found);
  }
  const dated = needs.formulas.flatMap((need) =>
    (days.get(need.version.id) ?? []).flatMap(({ date, share }) =>
      need.scaled.lines.flatMap(({ part, exactG }): DatedNeed[] =>
        part.kind !== 'ingredient'
          ? []
          : [
              {
                date,
                formula: { id: need.version.formulaId, name: need.name },
                ingredient: part.ingredient,
                grams: exactG * share,
              },
            ],
      ),
    ),
  );
  const decorations = needs.ingredients
    .filter((it) => it.asItIsG > 0)
    .map(({ ingredient, asItIsG }): DatedNeed => ({
      date: otherwise,
      formula: null,
      ingredient,
      grams: asItIsG,
    }));
  return [...dated, ...decorations];
}

function holds({ version }: FormulaNeed, versionId: string): boolean {
  return version.lines.some(
    ({ part }) => part.kind === 'formula' && part.formulaVersionId === versionId,
  );
}
