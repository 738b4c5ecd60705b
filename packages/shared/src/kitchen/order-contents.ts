import type { OrderContents } from '#shared/contracts/contents.ts';
import type { Design } from '#shared/contracts/design.ts';
import type { Advice, Estimate } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { mergeAllergens } from './merge-allergens.ts';
import { containedAllergens, partsOf } from './parts.ts';
import { resolveDesign } from './resolve-design.ts';

/** Yes-or-no facts about an order, from its parts' labels. */
export const contentFacts = [
  'gelatine',
  'alcohol',
  'cochineal',
  'honey',
  'animalOrigin',
  'undercookedEgg',
] as const;
export type ContentFact = (typeof contentFacts)[number];

/** What all parts of a design contain together. Throws `UnknownPart`. */
export function contentsOfDesign(design: Design, menu: Menu): OrderContents {
  const parts = partsOf(resolveDesign(design, menu));
  const has = (fact: ContentFact) => parts.some(({ contents }) => contents[fact]);
  return {
    allergens: containedAllergens(parts),
    handled: mergeAllergens([menu.studio.handles]),
    gelatine: has('gelatine'),
    alcohol: has('alcohol'),
    cochineal: has('cochineal'),
    honey: has('honey'),
    animalOrigin: has('animalOrigin'),
    undercookedEgg: has('undercookedEgg'),
  };
}

/** Advice that hangs on what is in a cake or handled near it, by its code. */
const aboutContents: ReadonlySet<Advice['code']> = new Set([
  'allergen',
  'allergen-unknown',
  'kitchen',
  'diet',
  'egg',
  'honey',
  'alcohol',
]);

export function isAboutContents({ code }: Pick<Advice, 'code'>): boolean {
  return aboutContents.has(code);
}

/**
 * An estimate with what the order contains today in the place of what it contained when it was
 * worked out; price, size and everything else stand as they were offered.
 */
export function withContents(
  estimate: Estimate,
  holds: OrderContents,
  advice: readonly Advice[],
): Estimate {
  return {
    ...estimate,
    allergens: holds.allergens,
    handled: holds.handled,
    advice: [...estimate.advice.filter((it) => !isAboutContents(it)), ...advice],
  };
}

/** Advice that holds now and did not before, or is a stop now where it was none. */
export function newAdvice(before: readonly Advice[], now: readonly Advice[]): Advice[] {
  return now.filter(
    (it) =>
      it.level !== 'ok' &&
      !before.some(
        (old) =>
          old.code === it.code &&
          old.about === it.about &&
          (old.level === it.level || old.level === 'stop'),
      ),
  );
}
