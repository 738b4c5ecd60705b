import * as z from 'zod/mini';
import { id, localDate, minor } from './common.ts';
import { eggPart, formulaKind } from './pantry.ts';

/** Grams as they are worked out, not rounded; pages round them. */
const grams = z.number();

/** A mixer's bowls of one formula. */
const bowls = z.object({
  mixer: z.string(),
  bowls: z.int(),
  eachG: grams,
  /** Minutes one whipped bowl takes to cool; null where none has to. */
  coolingMinutes: z.nullable(z.number()),
});

export const kitchenLine = z.object({
  name: z.string(),
  /** It is a formula of its own, further up the sheet. */
  formula: z.boolean(),
  exactG: grams,
  /** As the bench weighs it. */
  roundedG: grams,
  driftG: grams,
  /** "2½ cups", "5 sticks"; null where nothing sensible can be said. */
  household: z.nullable(z.string()),
  /** Whole eggs to crack; null where nothing is cracked. */
  eggs: z.nullable(z.int()),
});
export type KitchenLine = z.infer<typeof kitchenLine>;

export const kitchenFormula = z.object({
  versionId: id,
  formulaId: id,
  name: z.string(),
  n: z.int(),
  /** The number of the version made by today, where it is another. */
  newer: z.nullable(z.int()),
  kind: formulaKind,
  for: z.array(z.string()),
  /** Comes out, goes into the mixer, goes in by the rounded weights. */
  outG: grams,
  mixG: grams,
  roundedInG: grams,
  driftG: grams,
  lines: z.array(kitchenLine),
  bowls: z.nullable(bowls),
  pasteurised: z.boolean(),
});
export type KitchenFormula = z.infer<typeof kitchenFormula>;

const kitchenPart = z.object({
  part: z.enum(['sponge', 'filling', 'style', 'covering', 'decoration']),
  name: z.string(),
  inCakeG: grams,
  toMakeG: grams,
});

/** A tier, the sheet, one of a kind of cutting cake, or all decorations together. */
export const kitchenPiece = z.object({
  kind: z.enum(['tier', 'sheet', 'cutting-cake', 'decorations']),
  name: z.string(),
  count: z.int(),
  parts: z.array(kitchenPart),
});
export type KitchenPiece = z.infer<typeof kitchenPiece>;

/** Something no formula tells of; its weight is in none of the sums. */
export const unknownNeed = z.object({ name: z.string(), grams, message: z.string() });

/** `GET /api/staff/orders/:number/kitchen`: what goes into an order, by the formulas it keeps. */
export const kitchenSheet = z.object({
  number: z.int(),
  pieces: z.array(kitchenPiece),
  /** What is inside others before them. */
  formulas: z.array(kitchenFormula),
  ingredients: z.array(
    z.object({
      id,
      name: z.string(),
      brand: z.nullable(z.string()),
      grams,
      household: z.nullable(z.string()),
      /** How many packs it opens, as many as are used: 0.4 of one; null without a pack. */
      packs: z.nullable(z.number()),
    }),
  ),
  /** If nothing else were made that week. */
  eggs: z.object({ crack: z.int(), leftWhiteG: grams, leftYolkG: grams }),
  unknown: z.array(unknownNeed),
});
export type KitchenSheet = z.infer<typeof kitchenSheet>;

const costKind = z.enum([
  'ingredients',
  'eggs',
  'packaging',
  'decorations',
  'extras',
  'labour',
  'overhead',
]);
export type CostKind = z.infer<typeof costKind>;

const costItem = z.object({
  label: z.string(),
  grams: z.nullable(grams),
  minutes: z.nullable(z.int()),
  count: z.nullable(z.int()),
  /** Null while its price is not known. */
  amountMinor: z.nullable(minor),
});

export const costLine = z.object({
  kind: costKind,
  /** Of what is known; the items add up to it. */
  amountMinor: minor,
  items: z.array(costItem),
});
export type CostLine = z.infer<typeof costLine>;

export const payLever = z.object({
  kind: z.enum(['price', 'portion', 'size', 'minutes', 'ingredients', 'rush', 'discount']),
  title: z.string(),
  sentence: z.string(),
  /** It alone reaches the margin aimed for. */
  enough: z.boolean(),
});
export type PayLever = z.infer<typeof payLever>;

/** `GET /api/staff/orders/:number/cost`: what it costs to make and leaves; for the owner. */
export const orderCost = z.object({
  currency: z.string(),
  lines: z.array(costLine),
  totalMinor: minor,
  /** Missing from the total, by name; with any, the cost is at least the total. */
  unknown: z.array(z.string()),
  netPriceMinor: minor,
  /** The price is agreed, and not an offer any more. */
  agreed: z.boolean(),
  marginMinor: minor,
  /** Of the net price, parts per million; null where nothing is charged. */
  marginPpm: z.nullable(z.int()),
  targetMarginPpm: z.int(),
  minutes: z.int(),
  /** What would bring it to the target; empty where it is there. */
  levers: z.array(payLever),
});
export type OrderCost = z.infer<typeof orderCost>;

export const eggSize = z.enum(['jumbo', 'extra-large', 'large', 'medium']);
export type EggSizeName = z.infer<typeof eggSize>;

const mostDays = 31;
const span = <Shape extends z.core.$ZodLooseShape>(shape: Shape) =>
  z.object({ from: localDate, to: localDate, ...shape });
const withinAMonth = z.refine<{ from: string; to: string }>(
  (it) => it.from <= it.to && Date.parse(it.to) - Date.parse(it.from) < mostDays * 86_400_000,
  { message: `Ask for one to ${mostDays} days.`, path: ['to'] },
);

/** Days loose parts are kept after the day they were cracked, within the published two to four. */
const keptDays = z.int().check(z.minimum(2, 'At least 2 days.'), z.maximum(4, 'At most 4 days.'));

/** `GET /api/staff/eggs`: which eggs to crack on which day. */
export const eggsQuery = span({
  size: z.optional(eggSize),
  whiteDays: z.optional(keptDays),
  yolkDays: z.optional(keptDays),
}).check(withinAMonth);

/** `GET /api/staff/shopping`. */
export const shoppingQuery = span({ size: z.optional(eggSize) }).check(withinAMonth);

/** Orders whose work is meant, and those with a pickup then that have no place in the plan. */
const whose = { orders: z.array(z.int()), unplaced: z.array(z.int()) };

export const eggUse = z.object({
  formula: z.string(),
  orders: z.array(z.int()),
  part: eggPart,
  grams,
  from: z.array(z.object({ crackedOn: localDate, part: z.enum(['white', 'yolk']), grams })),
});
export type EggUseView = z.infer<typeof eggUse>;

export const eggDay = z.object({
  date: localDate,
  crack: z.int(),
  /** Of those, how many go in whole. */
  whole: z.int(),
  uses: z.array(eggUse),
});
export type EggDayView = z.infer<typeof eggDay>;

export const eggLeftover = z.object({
  crackedOn: localDate,
  whiteG: grams,
  yolkG: grams,
  whiteUseBy: z.nullable(localDate),
  yolkUseBy: z.nullable(localDate),
  uses: z.array(
    z.object({
      formulaId: id,
      name: z.string(),
      part: eggPart,
      outG: grams,
      /** Written for pasteurised egg. */
      pasteurised: z.boolean(),
    }),
  ),
});
export type EggLeftoverView = z.infer<typeof eggLeftover>;

export const eggCarton = z.object({
  name: z.string(),
  grams,
  formulas: z.array(z.string()),
  /** Null while nobody knows what a carton holds. */
  plan: z.nullable(
    z.object({
      cartons: z.int(),
      leftG: grams,
      days: z.array(
        z.object({
          date: localDate,
          open: z.int(),
          boughtFrom: localDate,
          useBy: localDate,
        }),
      ),
    }),
  ),
});
export type EggCartonView = z.infer<typeof eggCarton>;

export const cartonInstead = z.object({
  formulaId: id,
  formula: z.string(),
  part: z.enum(['white', 'yolk']),
  carton: z.string(),
  grams,
  /** More cartons to open, eggs to crack then, and how many fewer. */
  cartons: z.int(),
  eggs: z.int(),
  fewer: z.int(),
  whipped: z.boolean(),
});
export type CartonInsteadView = z.infer<typeof cartonInstead>;

export const eggPlan = z.object({
  from: localDate,
  to: localDate,
  size: eggSize,
  /** Days loose whites and yolks are kept. */
  whiteDays: z.int(),
  yolkDays: z.int(),
  eggs: z.int(),
  days: z.array(eggDay),
  leftovers: z.array(eggLeftover),
  cartons: z.array(eggCarton),
  alternatives: z.array(cartonInstead),
  ...whose,
});
export type EggPlanView = z.infer<typeof eggPlan>;

export const shoppingLine = z.object({
  id,
  name: z.string(),
  brand: z.nullable(z.string()),
  family: z.string(),
  grams,
  /** Eggs to crack; null for everything else. */
  eggs: z.nullable(z.int()),
  /** Null where no pack is known. */
  packs: z.nullable(z.int()),
  packG: z.nullable(grams),
  leftG: z.nullable(grams),
  usedMinor: z.nullable(minor),
  buyMinor: z.nullable(minor),
});
export type ShoppingLineView = z.infer<typeof shoppingLine>;

export const shopping = z.object({
  from: localDate,
  to: localDate,
  currency: z.string(),
  lines: z.array(shoppingLine),
  usedMinor: minor,
  buyMinor: minor,
  unpriced: z.array(z.string()),
  unknown: z.array(unknownNeed),
  ...whose,
});
export type Shopping = z.infer<typeof shopping>;
