import type { AllergenEntry } from '#shared/contracts/menu.ts';
import type { AllergenId, LabelRegion } from '#shared/contracts/vocabulary.ts';
import { formatList } from '#shared/dates/format.ts';
import {
  allergenLabel,
  allergenName,
  declarableAllergens,
  isMajorAllergen,
  sameSpecies,
  speciesName,
} from '../allergen-names.ts';
import type { IngredientNode } from '../derive-contents.ts';
import { mergeAllergens } from '../merge-allergens.ts';
import { capitalise } from '../sentences.ts';
import type { WeighedIngredient } from './weigh-ingredients.ts';

/** What the studio says of its own kitchen. */
export type KitchenWord = {
  /** Everything it handles. */
  readonly handles: readonly AllergenEntry[];
  /** Allergens with the owner's own risk assessment noted; only those may be a "may contain". */
  readonly assessed: ReadonlySet<AllergenId>;
};

/** The lines about allergens that stand beside a statement of ingredients; null where there are none. */
export type AllergenLines = {
  /** US: "Contains: Milk, Egg, Wheat." EU and UK emphasise in the list instead. */
  readonly contains: string | null;
  /** EU and UK: where to look. */
  readonly signpost: string | null;
  /** What no label tells, each in a sentence; never left out. */
  readonly notKnown: readonly string[];
  readonly mayContain: string | null;
  /** What the makers of bought products warn of, as theirs. */
  readonly makersWarn: string | null;
  readonly kitchen: string | null;
};

/** Something about a bought product that keeps a label from being printed. */
export type LabelGap = {
  readonly kind: 'unknown' | 'species';
  readonly ingredientId: string;
  readonly name: string;
  readonly allergens: readonly AllergenId[];
};

/** The cereal, the nut, the fish has to be told by its kind: FALCPA (21 USC 343(w)(2)), Annex II. */
const toldByKind: Readonly<Record<LabelRegion, readonly AllergenId[]>> = {
  US: ['gluten-cereals', 'tree-nuts', 'fish', 'crustaceans'],
  EU: ['gluten-cereals', 'tree-nuts'],
  UK: ['gluten-cereals', 'tree-nuts'],
};

/**
 * What is unknown of what the region's label names, or of what a guest of this cake must keep from,
 * and nuts and cereals whose kind is not told. Everything here stops a label.
 */
export function labelGaps(
  ingredients: readonly WeighedIngredient[],
  region: LabelRegion,
  declared: readonly AllergenId[],
): LabelGap[] {
  return productsOf(ingredients).flatMap((product) => {
    const unknown = product.allergens.filter((it) => isUnknown(it, region, declared));
    const kindless = product.allergens.filter(
      (it) =>
        it.state === 'contains' &&
        it.species.length === 0 &&
        toldByKind[region].includes(it.allergen),
    );
    return [gap('unknown', product, unknown), gap('species', product, kindless)].filter(
      (it) => it.allergens.length > 0,
    );
  });
}

function gap(
  kind: LabelGap['kind'],
  { id, name }: IngredientNode,
  entries: readonly AllergenEntry[],
): LabelGap {
  return { kind, ingredientId: id, name, allergens: entries.map((it) => it.allergen) };
}

function isUnknown(
  entry: AllergenEntry,
  region: LabelRegion,
  declared: readonly AllergenId[],
): boolean {
  return (
    entry.state === 'unknown' &&
    (isMajorAllergen(entry, region) || declared.includes(entry.allergen))
  );
}

/**
 * The lines, for ingredients and the kitchen they were worked in. `touching` is what is not eaten
 * and lies against what is; the Contains line names it too.
 */
export function allergenLines(
  ingredients: readonly WeighedIngredient[],
  kitchen: KitchenWord,
  region: LabelRegion,
  declared: readonly AllergenId[],
  touching: readonly AllergenEntry[] = [],
): AllergenLines {
  const all = mergeAllergens(ingredients.map((it) => it.allergens));
  const contained = all.filter((it) => it.state === 'contains');
  const named = mergeAllergens([contained, touching.filter((it) => it.state === 'contains')]);
  const major = (entries: readonly AllergenEntry[]) =>
    entries.filter((it) => isMajorAllergen(it, region));
  const handled = major(beyond(mergeAllergens([kitchen.handles]), contained));
  const assessed = handled.filter((it) => kitchen.assessed.has(it.allergen));
  const unsaid = handled.filter((it) => !kitchen.assessed.has(it.allergen));
  const warned = major(
    beyond(
      all.filter((it) => it.state === 'may-contain'),
      [...contained, ...assessed],
    ),
  );
  const isIn = contained.length > 0;
  return {
    contains:
      region === 'US' && major(named).length > 0
        ? `Contains: ${sourcesOf(named).map(title).join(', ')}.`
        : null,
    signpost: region !== 'US' && isIn ? 'For allergens, see the ingredients in bold.' : null,
    notKnown: notKnownOf(ingredients, region, declared),
    mayContain: line('May contain', assessed, region),
    makersWarn: line('Makers of our ingredients warn of', warned, region),
    kitchen: line('Made in a kitchen that also handles', unsaid, region),
  };
}

function line(head: string, entries: readonly AllergenEntry[], region: LabelRegion): string | null {
  if (entries.length === 0) return null;
  return `${head} ${formatList(entries.map((it) => allergenLabel(it, region)))}.`;
}

/** What some entries say beyond what is in the cake anyway, species by species. */
function beyond(
  entries: readonly AllergenEntry[],
  contained: readonly AllergenEntry[],
): AllergenEntry[] {
  return entries.flatMap((entry) => {
    const own = contained.filter((it) => it.allergen === entry.allergen);
    if (own.length === 0) return [entry];
    // Of something with no kinds, or whose kinds nobody told, there is no more to say.
    if (entry.species.length === 0 || own.some((it) => it.species.length === 0)) return [];
    const more = entry.species.filter(
      (it) => !own.some((have) => have.species.some((species) => sameSpecies(species, it))),
    );
    return more.length === 0 ? [] : [{ ...entry, species: more }];
  });
}

/**
 * The food sources of the major allergens, 21 USC 343(w)(1)(A) and (2): each by its name, tree nuts
 * by their kinds, and spelt or durum as wheat.
 */
function sourcesOf(contained: readonly AllergenEntry[]): string[] {
  return declarableAllergens('US').flatMap((allergen) =>
    contained
      .filter((it) => it.allergen === allergen && isMajorAllergen(it, 'US'))
      .map((it) => {
        if (allergen === 'gluten-cereals') return 'wheat';
        const kinds = it.species.map(speciesName).join(', ');
        return kinds === ''
          ? allergenName(allergen, 'US')
          : `${allergenName(allergen, 'US')} (${kinds})`;
      }),
  );
}

const title = (text: string): string =>
  text.replace(
    /(^|[\s(])(\p{Ll})/gu,
    (_, before: string, first: string) => `${before}${first.toUpperCase()}`,
  );

function notKnownOf(
  ingredients: readonly WeighedIngredient[],
  region: LabelRegion,
  declared: readonly AllergenId[],
): string[] {
  return productsOf(ingredients).flatMap((product) => {
    const unknown = product.allergens.filter((it) => isUnknown(it, region, declared));
    if (unknown.length === 0) return [];
    const names = formatList(unknown.map((it) => allergenLabel(it, region)));
    return [`Not known: whether ${product.name} contains ${names}.`];
  });
}

/** Every bought product once, in the order of the ingredients. */
function productsOf(ingredients: readonly WeighedIngredient[]): IngredientNode[] {
  const products = new Map<string, IngredientNode>();
  for (const it of ingredients) {
    for (const product of it.products) products.set(product.id, product);
  }
  return [...products.values()];
}

/** "Soy and milk of gold sprinkles are not known." for people at the bench. */
export function gapSentence({ kind, name, allergens }: LabelGap, region: LabelRegion): string {
  const names = formatList(allergens.map((it) => allergenName(it, region)));
  return kind === 'unknown'
    ? `${capitalise(name)}: its label does not settle ${names}. Read the label, or ask the maker, and enter it in the pantry.`
    : `${capitalise(name)}: a label has to name the kind of ${names}. Enter it in the pantry.`;
}
