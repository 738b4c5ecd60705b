import type { Declaration } from '#shared/contracts/design.ts';
import type { AllergenEntry, Contents } from '#shared/contracts/menu.ts';
import type { AllergenId, DietId, Severity } from '#shared/contracts/vocabulary.ts';
import { sameSpecies } from './allergen-names.ts';
import { heaviestOf, type DeclaredState } from './merge-allergens.ts';

/** An allergen declared from the list; those told in words are answered by a baker. */
export type ListedDeclaration = Declaration & { readonly allergen: AllergenId };

export function isListed(declaration: Declaration): declaration is ListedDeclaration {
  return declaration.allergen !== null;
}

/** Severities for which what a kitchen handles, or a maker warns of, is reason enough to stop. */
export const gravest: readonly Severity[] = ['coeliac', 'anaphylaxis'];
const grave: readonly Severity[] = ['allergy', ...gravest];

/** From the lightest to what asks for the most care. */
export const byGravity: readonly Severity[] = [
  'avoids',
  'intolerance',
  'allergy',
  'coeliac',
  'anaphylaxis',
];

/** The species a declaration is about; for coeliac disease every gluten cereal is. */
export function speciesOf({
  allergen,
  species,
  severity,
}: Pick<ListedDeclaration, 'allergen' | 'species' | 'severity'>): string | null {
  return severity === 'coeliac' && allergen === 'gluten-cereals' ? null : species;
}

/** How advice names what a declaration is about: "egg", "tree-nuts:pecan". */
export function subjectOf(
  declaration: Pick<ListedDeclaration, 'allergen' | 'species' | 'severity'>,
): string {
  const species = speciesOf(declaration);
  return species === null ? declaration.allergen : `${declaration.allergen}:${species}`;
}

/**
 * Whether an entry is about what was declared. An entry that names no species may be any; for
 * coeliac disease every gluten cereal is.
 */
export function isAbout(
  entry: Pick<AllergenEntry, 'allergen' | 'species'>,
  declaration: ListedDeclaration,
): boolean {
  if (entry.allergen !== declaration.allergen) return false;
  const species = speciesOf(declaration);
  if (species === null || entry.species.length === 0) return true;
  return entry.species.some((it) => sameSpecies(it, species));
}

/** How a part stands to a declaration; null where its labels do not mention it. */
export function stateFor(contents: Contents, declaration: ListedDeclaration): DeclaredState | null {
  return heaviestOf(
    contents.allergens.filter((it) => isAbout(it, declaration)).map((it) => it.state),
  );
}

/** Whether a part must be changed for a declaration; a maker's warning weighs by severity. */
export function clashesWith(contents: Contents, declaration: ListedDeclaration): boolean {
  const state = stateFor(contents, declaration);
  if (state === null) return false;
  return state !== 'may-contain' || grave.includes(declaration.severity);
}

/** The level of a maker's "may contain": a stop for those who are told to heed it. */
export function mayContainLevel(severity: Severity): 'care' | 'stop' {
  return grave.includes(severity) ? 'stop' : 'care';
}

const has = (contents: Contents, allergen: AllergenId): boolean =>
  contents.allergens.some((it) => it.allergen === allergen && it.state === 'contains');

/** One thing a diet may speak against, and how to see it in a part. */
const substances = {
  milk: (it: Contents) => has(it, 'milk'),
  egg: (it: Contents) => has(it, 'egg'),
  honey: (it: Contents) => it.honey,
  alcohol: (it: Contents) => it.alcohol,
  gelatine: (it: Contents) => it.gelatine,
  // Gelatine is named by its own name, not once more as what it is made of.
  'something of animal origin': (it: Contents) => it.animalOrigin && !it.gelatine,
  cochineal: (it: Contents) => it.cochineal,
  fish: (it: Contents) => has(it, 'fish'),
  crustaceans: (it: Contents) => has(it, 'crustaceans'),
  molluscs: (it: Contents) => has(it, 'molluscs'),
} as const;

type Substance = keyof typeof substances;

const slaughter = ['gelatine', 'something of animal origin', 'cochineal'] as const;
const shellfish = ['crustaceans', 'molluscs'] as const;

const spokenAgainst: Record<DietId, readonly Substance[]> = {
  vegan: ['milk', 'egg', 'honey', ...slaughter, 'fish', ...shellfish],
  vegetarian: [...slaughter, 'fish', ...shellfish],
  halal: ['alcohol', 'gelatine', 'something of animal origin', 'cochineal'],
  kosher: [...slaughter, ...shellfish],
  'no-alcohol': ['alcohol'],
  'no-gelatine': ['gelatine'],
};

/** What in a part does not go with a diet, as it is read: "milk", "gelatine". */
export function dietClashes(contents: Contents, diet: DietId): string[] {
  return spokenAgainst[diet].filter((it) => substances[it](contents));
}
