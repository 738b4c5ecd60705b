import type { Price } from '#shared/contracts/estimates.ts';
import type { CostKind } from '#shared/contracts/kitchen-sheet.ts';
import type { PartFormulas } from '#shared/contracts/pantry.ts';
import type { PriceBookContent } from '#shared/contracts/prices.ts';
import type { TaskKind } from '#shared/contracts/vocabulary.ts';
import type { Work } from '#shared/dates/model.ts';
import { groupBy } from '#shared/group-by.ts';
import { eggOf } from '../eggs/egg-of.ts';
import { formatLength } from '../measures.ts';
import type { IngredientNeed, KitchenNeeds } from '../needs/kitchen-needs.ts';
import { isPiped, timesOf } from '../piped.ts';
import type { ResolvedDesign } from '../resolve-design.ts';
import { shareOf } from '../shares.ts';
import { atHourlyRate, atPackPrice } from './at-pack-price.ts';

/** What the owner's cost is reckoned with. */
export type CostRates = Pick<
  PriceBookContent,
  'currency' | 'labourPerHourMinor' | 'overheadPpm' | 'targetMarginPpm' | 'packaging'
>;

export type CostInput = {
  readonly resolved: ResolvedDesign;
  readonly needs: KitchenNeeds;
  /** The work the design is planned as. */
  readonly work: readonly Pick<Work, 'kind' | 'benchMinutes'>[];
  readonly parts: PartFormulas;
  /** What the studio pays for each extra, minor units by its id. */
  readonly extraCosts: ReadonlyMap<string, number>;
  readonly rates: CostRates;
  readonly price: Pick<Price, 'totalMinor' | 'taxMinor'>;
};

/** One thing inside a line; null where its price is not known. */
export type CostItem = {
  readonly label: string;
  readonly grams: number | null;
  readonly minutes: number | null;
  readonly count: number | null;
  readonly amountMinor: number | null;
};

export type CostLine = {
  readonly kind: CostKind;
  /** Of what is known; the items add up to it. */
  readonly amountMinor: number;
  readonly items: readonly CostItem[];
};

export type DesignCost = {
  readonly currency: string;
  readonly lines: readonly CostLine[];
  /** All lines together. */
  readonly totalMinor: number;
  /** What is missing from it, by name; where there is anything the cost is at least the total. */
  readonly unknown: readonly string[];
  /** What is left of the price without its tax. */
  readonly netPriceMinor: number;
  readonly marginMinor: number;
  /** Of the net price, parts per million; null where nothing is charged. */
  readonly marginPpm: number | null;
  readonly targetMarginPpm: number;
  readonly minutes: number;
};

/** Kinds of work as a heading of their minutes. */
const workLabels: Readonly<Record<TaskKind, string>> = {
  bake: 'Baking',
  custard: 'Custards',
  buttercream: 'Buttercream',
  filling: 'Fillings and ganache',
  'fill-and-crumb-coat': 'Filling and crumb coats',
  'final-coat': 'Final coats',
  cover: 'Covering',
  decorate: 'Decorating',
  stack: 'Stacking',
  box: 'Boxing and cleaning down',
  handover: 'Handing over',
};

const noItem = { grams: null, minutes: null, count: null };

/**
 * What an order costs the studio and what it leaves of its price without tax, whole minor units
 * that add up exactly. A price nobody knows is named as unknown and never counted as nothing.
 */
export function costDesign(input: CostInput): DesignCost {
  const { needs, rates, price } = input;
  // What decorations are made of is in the owner's figure for their materials.
  const weighed = needs.ingredients
    .map((it) => ({ ...it, grams: it.grams - it.forDecorationsG }))
    .filter((it) => it.grams > 0);
  const eggs = weighed.filter((it) => eggOf(it.ingredient) !== null);
  const rest = weighed.filter((it) => eggOf(it.ingredient) === null);
  const direct: CostLine[] = [
    lineOf('ingredients', bought(rest)),
    lineOf('eggs', bought(eggs)),
    lineOf('packaging', packaging(input)),
    lineOf('decorations', decorations(input)),
    lineOf('extras', extras(input)),
    lineOf('labour', labour(input)),
  ].filter((it) => it.items.length > 0);
  const directMinor = sum(direct.map((it) => it.amountMinor));
  const overheadMinor = shareOf(directMinor, rates.overheadPpm, rates.currency);
  const lines =
    overheadMinor === 0
      ? direct
      : [
          ...direct,
          lineOf('overhead', [{ ...noItem, label: 'Overhead', amountMinor: overheadMinor }]),
        ];
  const totalMinor = directMinor + overheadMinor;
  const netPriceMinor = price.totalMinor - price.taxMinor;
  const marginMinor = netPriceMinor - totalMinor;
  return {
    currency: rates.currency,
    lines,
    totalMinor,
    unknown: [
      ...needs.unknown.map((it) => it.name),
      ...direct.flatMap((line) =>
        line.items.filter((it) => it.amountMinor === null).map((it) => it.label),
      ),
    ],
    netPriceMinor,
    marginMinor,
    marginPpm: netPriceMinor > 0 ? Math.round((marginMinor / netPriceMinor) * 1e6) : null,
    targetMarginPpm: rates.targetMarginPpm,
    minutes: sum(input.work.map((it) => it.benchMinutes)),
  };
}

function lineOf(kind: CostKind, items: readonly CostItem[]): CostLine {
  return { kind, amountMinor: sum(items.map((it) => it.amountMinor ?? 0)), items };
}

/** At pack price by what is used, not by whole packs: the rest of a pack makes the next cake. */
function bought(needs: readonly Pick<IngredientNeed, 'ingredient' | 'grams'>[]): CostItem[] {
  return needs.map(({ ingredient, grams }) => ({
    ...noItem,
    label: ingredient.name,
    grams,
    amountMinor: ingredient.pack === null ? null : atPackPrice(grams, ingredient.pack),
  }));
}

/** One box for the cake by its widest tier, a board under each tier, and both for a cutting cake. */
function packaging({ resolved, rates }: CostInput): CostItem[] {
  const { tiers, cuttingCakes, menu } = resolved;
  const widest = (block: { widthMm: number; depthMm: number }) =>
    Math.max(block.widthMm, block.depthMm);
  const wanted = [
    ...(tiers.length === 0
      ? []
      : [{ what: 'box', mm: Math.max(...tiers.map((it) => widest(it.block))), count: 1 }]),
    ...tiers.map((it) => ({ what: 'board', mm: widest(it.block), count: 1 })),
    ...cuttingCakes.flatMap(({ block, count }) => [
      { what: 'box', mm: widest(block), count },
      { what: 'board', mm: widest(block), count },
    ]),
  ];
  return wanted.map(({ what, mm, count }): CostItem => {
    const band = rates.packaging.find((it) => mm <= it.upToMm);
    const each = what === 'box' ? band?.boxMinor : band?.boardMinor;
    return {
      ...noItem,
      label: `${what === 'box' ? 'Box' : 'Board'}, ${formatLength(mm, menu.studio.lengthLead)}`,
      count,
      amountMinor: each === undefined ? null : each * count,
    };
  });
}

/** The owner's figure for what one takes; a border's buttercream is counted with its coat. */
function decorations({ resolved, parts }: CostInput): CostItem[] {
  return resolved.decorations
    .filter(({ placed, decoration }) => placed.source === 'studio' && !isPiped(decoration))
    .map((it): CostItem => {
      const count = timesOf(it, resolved.tiers.length);
      const each = parts.decorations[it.decoration.id]?.materialsCostMinor;
      return {
        ...noItem,
        label: it.decoration.name,
        count,
        amountMinor: each === undefined ? null : each * count,
      };
    });
}

function extras({ resolved, extraCosts }: CostInput): CostItem[] {
  return resolved.extras.map(({ extra, quantity }): CostItem => {
    const each = extraCosts.get(extra.id);
    return {
      ...noItem,
      label: extra.name,
      count: quantity,
      amountMinor: each === undefined ? null : each * quantity,
    };
  });
}

/** Hands only: an oven or a mixer that runs alone costs no wages. */
function labour({ work, rates }: CostInput): CostItem[] {
  return [...groupBy(work, (it) => it.kind)]
    .map(([kind, of]): CostItem => {
      const minutes = sum(of.map((it) => it.benchMinutes));
      return {
        ...noItem,
        label: workLabels[kind],
        minutes,
        amountMinor: atHourlyRate(minutes, rates.labourPerHourMinor),
      };
    })
    .filter((it) => it.minutes !== 0);
}

const sum = (numbers: readonly number[]): number => numbers.reduce((total, it) => total + it, 0);
