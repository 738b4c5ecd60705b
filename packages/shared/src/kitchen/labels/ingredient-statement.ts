import type { LabelSegment } from '#shared/contracts/cards.ts';
import type { AllergenEntry } from '#shared/contracts/menu.ts';
import type { LabelRegion } from '#shared/contracts/vocabulary.ts';
import { allergenName } from '../allergen-names.ts';
import { capitalise } from '../sentences.ts';
import { emphasise, joinSegments, plain } from './allergen-words.ts';
import type { WeighedIngredient } from './weigh-ingredients.ts';

/** Ingredients of so little may stand last together, 21 CFR 101.4(a)(2): two percent by weight. */
export const smallShare = 0.02;

/**
 * The statement of ingredients. US: descending by weight as used, compounds in parentheses
 * (21 CFR 101.4(a)(1), (b)(2)), those of two percent or less last as one group (101.4(a)(2)). EU and
 * UK: descending by weight as used, water by what is left of it in the finished food (Annex VII A.1),
 * and allergens emphasised in the list (article 21(1)(b)). `finishedG` is what all of it weighs in
 * the end.
 */
export function ingredientStatement(
  ingredients: readonly WeighedIngredient[],
  region: LabelRegion,
  finishedG: number,
): LabelSegment[] {
  const words = (it: WeighedIngredient) => wordsOf(it, region);
  if (region !== 'US') return sentence(listed(byWeightLeft(ingredients, finishedG).map(words)));
  const total = ingredients.reduce((sum, it) => sum + it.usedG, 0);
  const isSmall = (it: WeighedIngredient) => it.usedG <= smallShare * total;
  const large = ingredients.filter((it) => !isSmall(it));
  const small = ingredients.filter(isSmall);
  // Where everything is of so little, there is nothing for a group to stand behind.
  if (small.length === 0 || large.length === 0) return sentence(listed(ingredients.map(words)));
  return sentence([
    ...listed(large.map(words)),
    plain('. Contains 2% or less of: '),
    ...listed(small.map(words)),
  ]);
}

function wordsOf(ingredient: WeighedIngredient, region: LabelRegion): LabelSegment[] {
  const { name, madeOf } = ingredient;
  if (region === 'US') return [plain(madeOf === '' ? name : `${name} (${madeOf})`)];
  const contained = ingredient.allergens.filter((it) => it.state === 'contains');
  const labelOf = (entry: AllergenEntry) => allergenName(entry.allergen, region);
  return emphasise(ingredient, contained, labelOf);
}

/** Water goes by what is left: the finished food less everything else that went in. */
function byWeightLeft(
  ingredients: readonly WeighedIngredient[],
  finishedG: number,
): WeighedIngredient[] {
  const isWater = (it: WeighedIngredient) =>
    /^(?:(?:tap|drinking|filtered) )?water$/iu.test(it.name);
  const others = ingredients.filter((it) => !isWater(it)).reduce((sum, it) => sum + it.usedG, 0);
  const leftG = Math.max(0, finishedG - others);
  return ingredients
    .map((it) => (isWater(it) ? { ...it, usedG: Math.min(it.usedG, leftG) } : it))
    .sort((a, b) => b.usedG - a.usedG);
}

function listed(entries: readonly (readonly LabelSegment[])[]): LabelSegment[] {
  return entries.flatMap((entry, index) => (index === 0 ? entry : [plain(', '), ...entry]));
}

/** With a capital at the head and a full stop at the end; nothing at all for nothing. */
function sentence(segments: readonly LabelSegment[]): LabelSegment[] {
  const [first, ...rest] = joinSegments(segments);
  if (first === undefined) return [];
  return joinSegments([{ ...first, text: capitalise(first.text) }, ...rest, plain('.')]);
}
