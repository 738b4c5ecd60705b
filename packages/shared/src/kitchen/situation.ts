import type { CoatRank } from '#shared/contracts/estimates.ts';
import type { Contents } from '#shared/contracts/menu.ts';
import { clashesWith, dietClashes, isListed } from './clashes.ts';
import { warmthOf, type Warmth } from './heat.ts';
import type { Part } from './parts.ts';
import type { ResolvedDesign } from './resolve-design.ts';

/** What every rule of advice looks at. */
export type Situation = {
  readonly resolved: ResolvedDesign;
  /** Day the cake is for, or null. */
  readonly date: string | null;
  readonly parts: readonly Part[];
  /** Coats from best to worst for this table; ways out are offered in that order. */
  readonly ranks: readonly CoatRank[];
  /** Null while the setting is not told. */
  readonly warmth: Warmth | null;
};

/** Everything but the ranks, which are worked out from it. */
export type Table = Omit<Situation, 'ranks'>;

/** The situation a design is judged in, before its coats are ranked. */
export function tableOf(
  resolved: ResolvedDesign,
  parts: readonly Part[],
  date: string | null,
): Table {
  const { setting } = resolved.design;
  return {
    resolved,
    date,
    parts,
    warmth: setting === null ? null : warmthOf(setting, resolved.menu.studio, date),
  };
}

/** Whether something may not be eaten by a guest who was told of. */
export function clashesWithGuests(resolved: ResolvedDesign): (contents: Contents) => boolean {
  const { allergies, diets, susceptible, infants } = resolved.design.guests;
  const listed = allergies.filter(isListed);
  return (contents) =>
    listed.some((it) => clashesWith(contents, it)) ||
    diets.some((diet) => dietClashes(contents, diet).length > 0) ||
    (susceptible && contents.undercookedEgg) ||
    (infants && contents.honey);
}
