import type { CoatRank } from '#shared/contracts/estimates.ts';
import type { ButtercreamStyle, Contents, Covering } from '#shared/contracts/menu.ts';
import type { AdviceLevel } from '#shared/contracts/vocabulary.ts';
import { clashesWith, dietClashes, isListed, stateFor } from './clashes.ts';
import { warmthOf, type Warmth } from './heat.ts';
import type { Part } from './parts.ts';
import type { ResolvedDesign } from './resolve-design.ts';

/** A covering over a style, or one that needs none. */
export type Coat = { readonly covering: Covering; readonly style: ButtercreamStyle | null };

/** A coat of the menu with how it fares at this table. */
export type RankedCoat = Coat & {
  readonly rank: CoatRank;
  /** How it fares in the place alone, whatever is in it. */
  readonly heat: AdviceLevel;
};

/** What every rule of advice looks at. */
export type Situation = {
  readonly resolved: ResolvedDesign;
  /** Day the cake is for, or null. */
  readonly date: string | null;
  /** When it is collected, minutes since midnight, or null. */
  readonly collectAt: number | null;
  readonly parts: readonly Part[];
  /** Coats from best to worst for this table; ways out are offered in that order. */
  readonly coats: readonly RankedCoat[];
  /** Null while the setting is not told. */
  readonly warmth: Warmth | null;
  /**
   * What of the guests' allergies, diets and cautions speaks against something, by name and by how
   * it is known ("egg:contains"); empty where nothing does.
   */
  readonly guestClashes: (contents: Contents) => readonly string[];
};

/** Everything but the coats, which are ranked by it. */
export type Table = Omit<Situation, 'coats'>;

/** The situation a design is judged in, before its coats are ranked. */
export function tableOf(
  resolved: ResolvedDesign,
  parts: readonly Part[],
  when: { readonly date: string | null; readonly collectAt: number | null },
): Table {
  const { setting } = resolved.design;
  return {
    resolved,
    ...when,
    parts,
    warmth: setting === null ? null : warmthOf(setting, resolved.menu, when.date),
    guestClashes: guestClashesOf(resolved),
  };
}

/** As `Situation.guestClashes`; asked again and again of the same parts, so answers are kept. */
export function guestClashesOf(
  resolved: ResolvedDesign,
): (contents: Contents) => readonly string[] {
  const { allergies, diets, susceptible, infants } = resolved.design.guests;
  const listed = allergies.filter(isListed);
  const known = new Map<Contents, readonly string[]>();
  return (contents) => {
    const before = known.get(contents);
    if (before !== undefined) return before;
    const clashes = [
      ...listed
        .filter((it) => clashesWith(contents, it))
        .map((it) => `${it.allergen}:${it.species ?? ''}:${stateFor(contents, it) ?? ''}`),
      ...diets.filter((diet) => dietClashes(contents, diet).length > 0),
      ...(susceptible && contents.undercookedEgg ? ['undercooked-egg'] : []),
      ...(infants && contents.honey ? ['honey'] : []),
    ];
    known.set(contents, clashes);
    return clashes;
  };
}

/** Whether something may not be eaten by a guest who was told of. */
export function guestsClash(resolved: ResolvedDesign): (contents: Contents) => boolean {
  const clashes = guestClashesOf(resolved);
  return (contents) => clashes(contents).length > 0;
}
