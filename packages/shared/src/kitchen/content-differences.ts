import type { OrderContents } from '#shared/contracts/contents.ts';
import type { ContainedAllergen } from '#shared/contracts/estimates.ts';
import type { LabelRegion } from '#shared/contracts/vocabulary.ts';
import { formatList } from '#shared/dates/format.ts';
import { allergenLabel, allergenName } from './allergen-names.ts';
import { contentFacts, type ContentFact } from './order-contents.ts';
import { capitalise } from './sentences.ts';

/**
 * What an order contains now and did not before, and what its labels do not name any more: a
 * sentence each, about the cake and never about who eats it. Empty where nobody need be told. What
 * is not named any more is never called gone: traces and other labels are not looked at here.
 */
export function contentDifferences(
  before: OrderContents,
  now: OrderContents,
  region: LabelRegion,
): string[] {
  return [
    ...now.allergens.flatMap((entry) => gained(entry, before, region)),
    ...before.allergens.flatMap((entry) => lost(entry, now, region)),
    ...contentFacts.flatMap((fact) => {
      if (before[fact] === now[fact]) return [];
      return [now[fact] ? factNow[fact] : `${capitalise(factNames[fact])} is ${notNamed}.`];
    }),
    ...newlyHandled(before, now, region),
  ];
}

const notNamed = 'not on its labels any more';

function gained(entry: ContainedAllergen, before: OrderContents, region: LabelRegion): string[] {
  const { allergen, state, parts } = entry;
  const old = before.allergens.find((it) => it.allergen === allergen && it.state === state);
  const isKnown =
    old !== undefined &&
    covers(old.species, entry.species) &&
    parts.every((part) => old.parts.includes(part));
  if (isKnown) return [];
  const label = allergenLabel(entry, region);
  const where = formatList(parts);
  if (state === 'contains') return [`It contains ${label} now: in ${where}.`];
  return state === 'may-contain'
    ? [`A maker’s label warns of ${label} now: in ${where}.`]
    : [`Nobody knows yet whether there is ${label} in ${where}.`];
}

/** Told only where the allergen stands in no heavier or lighter way either. */
function lost(entry: ContainedAllergen, now: OrderContents, region: LabelRegion): string[] {
  const still = now.allergens.filter((it) => it.allergen === entry.allergen);
  if (still.length === 0) return [sentence(entry, region, notNamed)];
  if (entry.species.length === 0 || still.some(({ species }) => species.length === 0)) return [];
  const named = new Set(still.flatMap(({ species }) => species));
  const species = entry.species.filter((it) => !named.has(it));
  if (species.length === 0) return [];
  return [sentence({ ...entry, species }, region, notNamed)];
}

/** "Tree nuts (hazelnut) are ...": the lists' plurals, and no other, end in s. */
function sentence(
  entry: Pick<ContainedAllergen, 'allergen' | 'species'>,
  region: LabelRegion,
  what: string,
): string {
  const be = allergenName(entry.allergen, region).endsWith('s') ? 'are' : 'is';
  return `${capitalise(allergenLabel(entry, region))} ${be} ${what}.`;
}

/** No species means any of them. */
function covers(known: readonly string[], asked: readonly string[]): boolean {
  return (
    known.length === 0 || (asked.length > 0 && asked.every((species) => known.includes(species)))
  );
}

const factNames: Record<ContentFact, string> = {
  gelatine: 'gelatine',
  alcohol: 'alcohol',
  cochineal: 'cochineal',
  honey: 'honey',
  animalOrigin: 'something from meat, fish or slaughter',
  undercookedEgg: 'egg that is neither pasteurized nor cooked through',
};

/** What no label settles counts as there, so the words leave both open. */
const factNow: Record<ContentFact, string> = {
  gelatine: 'There is gelatine in it now, or a label that does not rule it out.',
  alcohol: 'There is alcohol in it now, or a label that does not rule it out.',
  cochineal: 'There is cochineal in it now, or a label that does not rule it out.',
  honey: 'There is honey in it now, or a label that does not rule it out.',
  animalOrigin:
    'There is something from meat, fish or slaughter in it now, or a label that does not rule it out.',
  undercookedEgg: 'There is egg in it now that is neither pasteurized nor cooked through.',
};

function newlyHandled(before: OrderContents, now: OrderContents, region: LabelRegion): string[] {
  return now.handled
    .filter(({ allergen, species }) => {
      if (now.allergens.some((it) => it.allergen === allergen && it.state === 'contains')) {
        return false;
      }
      const old = before.handled.find((it) => it.allergen === allergen);
      return old === undefined || !covers(old.species, species);
    })
    .map((entry) => sentence(entry, region, 'handled in our kitchen now'));
}
