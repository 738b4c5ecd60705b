import type { Declaration } from '#shared/contracts/design.ts';
import type { Contents, Decoration } from '#shared/contracts/menu.ts';
import type { DietId, LabelRegion } from '#shared/contracts/vocabulary.ts';
import { allergenLabel, allergenName, speciesName } from '#shared/kitchen/allergen-names.ts';
import { clashesWith, dietClashes, isListed } from '#shared/kitchen/clashes.ts';
import { isPiped } from '#shared/kitchen/piped.ts';
import { formatList } from '#shared/dates/format.ts';
import { dietWords } from './diet-words.ts';

/** "contains milk and egg", with what a maker warns of or does not say; never that it is without. */
export function containsLine(contents: Contents, region: LabelRegion): string {
  const named = (state: 'contains' | 'may-contain' | 'unknown') =>
    contents.allergens.filter((it) => it.state === state).map((it) => allergenLabel(it, region));
  const parts = [
    ['contains', named('contains')],
    ['may contain', named('may-contain')],
    ['label unclear about', named('unknown')],
  ] as const;
  const known = parts
    .filter(([, names]) => names.length > 0)
    .map(([verb, names]) => `${verb} ${formatList(names)}`);
  if (contents.alcohol) known.push('made with alcohol');
  if (contents.gelatine) known.push('made with gelatine');
  return known.length === 0 ? 'no allergen named on its labels' : known.join('; ');
}

/** Whether labels name anything in it, or warn of it, or leave it open. */
export const namesAnything = ({ allergens, alcohol, gelatine }: Contents): boolean =>
  alcohol || gelatine || allergens.some((it) => it.state !== 'not-declared');

/**
 * What there is to say of a decoration's contents. Nothing of one that is piped from the coat: what
 * is in that is in it, and "none named" would be untrue. What comes off before eating lies against
 * the cake until then, so what is named in it is said too.
 */
export function contentsToSay(decoration: Decoration): Contents | undefined {
  if (isPiped(decoration)) return undefined;
  const { contents, edge } = decoration;
  return edge === 'edible' || namesAnything(contents) ? contents : undefined;
}

/** A declaration in a few words: "egg", "hazelnut", or what was written. */
export function declaredName(declaration: Declaration, region: LabelRegion): string {
  if (declaration.allergen === null) return declaration.text.trim();
  return declaration.species === null
    ? allergenName(declaration.allergen, region)
    : speciesName(declaration.species);
}

/** The guests' allergies and diets that speak against a part; empty where none is known to. */
export function clashesOf(
  contents: Contents,
  allergies: readonly Declaration[],
  diets: readonly DietId[],
  region: LabelRegion,
): readonly string[] {
  return [
    ...allergies
      .filter((it) => isListed(it) && clashesWith(contents, it))
      .map((it) => declaredName(it, region)),
    ...diets.filter((it) => dietClashes(contents, it).length > 0).map((it) => dietWords[it]),
  ];
}
