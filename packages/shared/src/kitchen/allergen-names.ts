import { allergenIds, type AllergenId, type LabelRegion } from '#shared/contracts/vocabulary.ts';

/** FDA's tree nuts that count as major allergens (guidance of January 2025; coconut is not one). */
export const usTreeNuts = [
  'almond',
  'black-walnut',
  'brazil-nut',
  'california-walnut',
  'cashew',
  'hazelnut',
  'heartnut',
  'macadamia',
  'pecan',
  'pine-nut',
  'pistachio',
  'english-walnut',
] as const;

/** Nuts of Regulation (EU) 1169/2011 Annex II, point 8. */
export const euTreeNuts = [
  'almond',
  'hazelnut',
  'walnut',
  'cashew',
  'pecan',
  'brazil-nut',
  'pistachio',
  'macadamia',
] as const;

/** Cereals of Annex II, point 1. */
export const euCereals = ['wheat', 'spelt', 'khorasan', 'rye', 'barley', 'oats'] as const;

/** The nine of FALCPA (2004) and the FASTER Act (2021); wheat stands for gluten cereals. */
const usNine: readonly AllergenId[] = [
  'milk',
  'egg',
  'fish',
  'crustaceans',
  'tree-nuts',
  'peanut',
  'gluten-cereals',
  'soy',
  'sesame',
];

type Region = LabelRegion;

const names: Record<AllergenId, { readonly us: string; readonly eu: string }> = {
  'gluten-cereals': { us: 'wheat (gluten cereals)', eu: 'gluten cereals' },
  crustaceans: { us: 'crustacean shellfish', eu: 'crustaceans' },
  egg: { us: 'egg', eu: 'egg' },
  fish: { us: 'fish', eu: 'fish' },
  peanut: { us: 'peanut', eu: 'peanut' },
  soy: { us: 'soy', eu: 'soya' },
  milk: { us: 'milk', eu: 'milk' },
  'tree-nuts': { us: 'tree nuts', eu: 'nuts' },
  celery: { us: 'celery', eu: 'celery' },
  mustard: { us: 'mustard', eu: 'mustard' },
  sesame: { us: 'sesame', eu: 'sesame' },
  sulphites: { us: 'sulfites', eu: 'sulphites' },
  lupin: { us: 'lupin', eu: 'lupin' },
  molluscs: { us: 'mollusks', eu: 'molluscs' },
};

/** Wheat and its kin: what a US label calls wheat. */
const wheats: readonly string[] = ['wheat', 'spelt', 'khorasan', 'durum', 'emmer', 'einkorn'];

/** Walnuts under any of their names; somebody told to keep from one is told of all. */
const walnuts: readonly string[] = [
  'walnut',
  'english-walnut',
  'california-walnut',
  'black-walnut',
  'heartnut',
];

const families: readonly (readonly string[])[] = [wheats, walnuts];

/** A species as it is read: `brazil-nut` is "Brazil nut". */
export function speciesName(species: string): string {
  const words = species.replaceAll('-', ' ');
  return words.replace(
    /^(?:brazil|english|california)\b/,
    (it) => it.charAt(0).toUpperCase() + it.slice(1),
  );
}

/** Whether two species are one for somebody who must keep from either. */
export function sameSpecies(a: string, b: string): boolean {
  return a === b || families.some((family) => family.includes(a) && family.includes(b));
}

/** Whether the region's law names the allergen on labels (US nine, EU and UK fourteen). */
export function isMajorAllergen(
  entry: { readonly allergen: AllergenId; readonly species: readonly string[] },
  region: Region,
): boolean {
  if (region !== 'US') return true;
  if (entry.allergen === 'gluten-cereals') {
    return entry.species.length === 0 || entry.species.some((it) => wheats.includes(it));
  }
  if (entry.allergen === 'tree-nuts') {
    const nuts: readonly string[] = [...usTreeNuts, ...walnuts];
    return entry.species.length === 0 || entry.species.some((it) => nuts.includes(it));
  }
  return usNine.includes(entry.allergen);
}

/** An allergen in the region's words, without its species: "tree nuts", "gluten cereals". */
export function allergenName(allergen: AllergenId, region: Region): string {
  return region === 'US' ? names[allergen].us : names[allergen].eu;
}

/**
 * An allergen as the region prints it, with its species where the law wants them: US "wheat",
 * "tree nuts (hazelnut)"; EU "gluten cereals (wheat)", "nuts (hazelnut)".
 */
export function allergenLabel(
  entry: { readonly allergen: AllergenId; readonly species: readonly string[] },
  region: Region,
): string {
  const { allergen, species } = entry;
  const ofSpecies = species.map(speciesName).join(', ');
  if (region === 'US' && allergen === 'gluten-cereals' && species.length > 0) return ofSpecies;
  return species.length === 0
    ? allergenName(allergen, region)
    : `${allergenName(allergen, region)} (${ofSpecies})`;
}

/**
 * What a guest may declare, the region's own list first and then the rest of the other list:
 * customers may declare from either.
 */
export function declarableAllergens(region: Region): readonly AllergenId[] {
  if (region !== 'US') return allergenIds;
  return [...usNine, ...allergenIds.filter((it) => !usNine.includes(it))];
}

/** Species a guest may narrow an allergen to; empty where it has none. */
export function declarableSpecies(allergen: AllergenId, region: Region): readonly string[] {
  if (allergen === 'tree-nuts') return region === 'US' ? usTreeNuts : euTreeNuts;
  return allergen === 'gluten-cereals' ? euCereals : [];
}

/** The disease as the region writes it: "celiac" in the US. */
export function spelledFor(region: LabelRegion, text: string): string {
  return region === 'US' ? text.replace(/([Cc])oeliac/g, '$1eliac') : text;
}
