import type { CoatRank } from '#shared/contracts/estimates.ts';
import type { ButtercreamStyle, Contents, Covering } from '#shared/contracts/menu.ts';
import { clashesWith, dietClashes, isListed } from './clashes.ts';
import { warmthOf, type Warmth } from './heat.ts';
import type { Part } from './parts.ts';
import type { ResolvedDesign } from './resolve-design.ts';

/** A covering over a style, or one that needs none. */
export type Coat = { readonly covering: Covering; readonly style: ButtercreamStyle | null };

/** A coat of the menu with how it fares at this table. */
export type RankedCoat = Coat & { readonly rank: CoatRank };

/** What every rule of advice looks at. */
export type Situation = {
  readonly resolved: ResolvedDesign;
  /** Day the cake is for, or null. */
  readonly date: string | null;
  readonly parts: readonly Part[];
  /** Coats from best to worst for this table; ways out are offered in that order. */
  readonly coats: readonly RankedCoat[];
  /** Null while the setting is not told. */
  readonly warmth: Warmth | null;
  /** Whether something may not be eaten by a guest who was told of. */
  readonly clashesWithGuests: (contents: Contents) => boolean;
};

/** Everything but the coats, which are ranked by it. */
export type Table = Omit<Situation, 'coats'>;

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
    clashesWithGuests: guestsClash(resolved),
  };
}

/** As `clashesWithGuests`; asked again and again of the same parts, so answers are kept. */
export function guestsClash(resolved: ResolvedDesign): (contents: Contents) => boolean {
  const { allergies, diets, susceptible, infants } = resolved.design.guests;
  const listed = allergies.filter(isListed);
  const known = new Map<Contents, boolean>();
  return (contents) => {
    const before = known.get(contents);
    if (before !== undefined) return before;
    const clash =
      listed.some((it) => clashesWith(contents, it)) ||
      diets.some((diet) => dietClashes(contents, diet).length > 0) ||
      (susceptible && contents.undercookedEgg) ||
      (infants && contents.honey);
    known.set(contents, clash);
    return clash;
  };
}
