import type { Ingredient } from '#shared/contracts/pantry.ts';
import { atPackPrice } from '../cost/at-pack-price.ts';
import { eggOf } from '../eggs/egg-of.ts';
import { shellEggG } from '../formulas/round-grams.ts';

/** One thing to buy; null where its pack is not known. */
export type ShoppingLine = {
  readonly ingredient: Ingredient;
  readonly grams: number;
  /** Eggs to crack; null for what is not cracked. */
  readonly eggs: number | null;
  readonly packs: number | null;
  /** Of the last pack, grams. */
  readonly leftG: number | null;
  /** What is used, at pack price, and what the packs cost. */
  readonly usedMinor: number | null;
  readonly buyMinor: number | null;
};

export type ShoppingList = {
  readonly lines: readonly ShoppingLine[];
  /** Of the priced lines. */
  readonly usedMinor: number;
  readonly buyMinor: number;
  /** Names of what has no pack or no price; not in the sums. */
  readonly unpriced: readonly string[];
};

export type EggsToBuy = {
  /** Eggs to crack, from the joint plan. */
  readonly shell: number;
  /** Cartons to open by ingredient: one kept open too long is not the next day's. */
  readonly cartons: ReadonlyMap<string, number>;
};

/** A weight of something bought. */
export type Bought = { readonly ingredient: Ingredient; readonly grams: number };

/** The same ingredient of several orders is one need. */
function together(needs: readonly Bought[]): Bought[] {
  const sums = new Map<string, Bought>();
  for (const { ingredient, grams } of needs) {
    const known = sums.get(ingredient.id)?.grams ?? 0;
    sums.set(ingredient.id, { ingredient, grams: known + grams });
  }
  return [...sums.values()];
}

/**
 * What to buy for so many needs, in whole packs. Eggs that are cracked are bought as eggs, whatever
 * part of them is used: `shelf` is where the studio's shell egg is found, among all ingredients.
 * What costs nothing (tap water) is not bought.
 */
export function shoppingList(
  needs: readonly Bought[],
  eggs: EggsToBuy,
  shelf: readonly Ingredient[],
): ShoppingList {
  const wanted = together(needs);
  const shell = wanted.filter((it) => eggOf(it.ingredient)?.shell === true);
  const rest = wanted.filter((it) => eggOf(it.ingredient)?.shell !== true);
  const lines = rest
    .filter((it) => it.ingredient.pack?.priceMinor !== 0)
    .map((it) => lineOf(it, eggs.cartons.get(it.ingredient.id)));
  const first = shell[0];
  if (first !== undefined && eggs.shell > 0) {
    const dozen = shellEgg(shelf) ?? first.ingredient;
    lines.push(eggLine(dozen, shell, eggs.shell));
  }
  const sorted = lines.toSorted(
    (a, b) =>
      a.ingredient.family.localeCompare(b.ingredient.family) ||
      a.ingredient.name.localeCompare(b.ingredient.name),
  );
  const sum = (of: (it: ShoppingLine) => number | null) =>
    sorted.reduce((total, it) => total + (of(it) ?? 0), 0);
  return {
    lines: sorted,
    usedMinor: sum((it) => it.usedMinor),
    buyMinor: sum((it) => it.buyMinor),
    unpriced: sorted.filter((it) => it.buyMinor === null).map((it) => it.ingredient.name),
  };
}

/** Whole eggs in their shell, as the studio buys them now. */
function shellEgg(shelf: readonly Ingredient[]): Ingredient | undefined {
  return shelf.find(
    (it) => it.archivedAt === null && eggOf(it)?.shell === true && it.eggPart === 'whole',
  );
}

function lineOf({ ingredient, grams }: Bought, cartons: number | undefined): ShoppingLine {
  const { pack } = ingredient;
  if (pack === null) return unknown(ingredient, grams, null);
  // A hair over is not another pack: nobody weighs it.
  const packs = cartons ?? Math.max(1, Math.ceil(grams / pack.grams - 1e-9));
  return {
    ingredient,
    grams,
    eggs: null,
    packs,
    leftG: Math.max(0, packs * pack.grams - grams),
    usedMinor: atPackPrice(grams, pack),
    buyMinor: packs * pack.priceMinor,
  };
}

function eggLine(egg: Ingredient, needs: readonly Bought[], count: number): ShoppingLine {
  const grams = needs.reduce((sum, it) => sum + it.grams, 0);
  const { pack } = egg;
  const eachG = shellEggG(egg);
  if (pack === null || eachG === null) return unknown(egg, grams, count);
  const inPack = Math.max(1, Math.round(pack.grams / eachG));
  const packs = Math.ceil(count / inPack);
  return {
    ingredient: egg,
    grams,
    eggs: count,
    packs,
    leftG: null,
    usedMinor: atPackPrice(count * eachG, pack),
    buyMinor: packs * pack.priceMinor,
  };
}

function unknown(ingredient: Ingredient, grams: number, eggs: number | null): ShoppingLine {
  return {
    ingredient,
    grams,
    eggs,
    packs: null,
    leftG: null,
    usedMinor: null,
    buyMinor: null,
  };
}
