import * as z from 'zod/mini';
import { id, localDate, minor, minuteOfDay } from './common.ts';
import { allergenEntry } from './menu.ts';
import { adviceLevel, coveringId, styleId } from './vocabulary.ts';
import { cake, cuttingCake, design, look, setting, sheet, tier } from './design.ts';

/** `POST /api/estimates`: a design, and the day it is for if one is chosen (rush, season). */
export const estimateRequest = z.object({
  design,
  date: z.nullable(localDate),
  /** When it is collected, where that is chosen: minutes since midnight. */
  collectAt: z.optional(z.nullable(minuteOfDay)),
});
export type EstimateRequest = z.infer<typeof estimateRequest>;

export const priceLine = z.object({
  kind: z.enum([
    'tier',
    'sheet',
    'cutting-cake',
    'sponge',
    'filling',
    'frosting',
    'decoration',
    'words',
    'finish',
    'extra',
    'rush',
    'delivery',
    'minimum',
    'discount',
    'tax',
    'rounding',
  ]),
  label: z.string(),
  quantity: z.int(),
  amountMinor: minor,
  taxCategory: z.nullable(z.string()),
});
export type PriceLine = z.infer<typeof priceLine>;

export const price = z.object({
  currency: z.string(),
  priceBookVersionId: id,
  lines: z.array(priceLine),
  /** Before tax on top; the whole where tax is inclusive. */
  subtotalMinor: minor,
  taxMinor: minor,
  taxInclusive: z.boolean(),
  totalMinor: minor,
  depositMinor: minor,
});
export type Price = z.infer<typeof price>;

/** A change of the design that one press applies; only the parts that change are present. */
export const designPatch = z.object({
  cake: z.optional(cake),
  setting: z.optional(setting),
  look: z.optional(look),
});
export type DesignPatch = z.infer<typeof designPatch>;

export const adviceCodes = [
  'heat',
  'heat-unknown',
  'sun',
  'time-out',
  'drive',
  'detail',
  'soft-filling',
  'allergen',
  'kitchen',
  'allergen-unknown',
  'allergy-text',
  'egg',
  'infants',
  'honey',
  'alcohol',
  'diet',
  'supports',
  'inedible',
  'small-parts',
  'flowers',
  'deep-colour',
  'portions',
  'words-length',
  'too-big',
] as const;

/** Something worked out about a design in its setting or for its guests. */
export const advice = z.object({
  code: z.enum(adviceCodes),
  level: adviceLevel,
  /** Which step of the order it belongs to. */
  step: z.enum(['day', 'cake', 'setting', 'look']),
  /** What it is about: a tier, a part, an allergen; for keys and links. */
  about: z.string(),
  /** To the customer, kindly. */
  sentence: z.string(),
  /** The same to whoever bakes it, plainly; empty in what was worked out before it was said. */
  plain: z._default(z.string(), ''),
  /** What to do instead; empty if there is nothing. */
  instead: z.string(),
  ways: z.array(
    z.object({
      label: z.string(),
      /** What one press changes, part by part: "Vanilla sponge becomes Dark cocoa sponge". */
      changes: z._default(z.array(z.string()), []),
      patch: designPatch,
    }),
  ),
  /** A stop that the owner may lift with a written reason after talking. */
  talk: z.boolean(),
});
export type Advice = z.infer<typeof advice>;

export const proposal = z.object({
  id: z.string(),
  name: z.string(),
  /** "just enough", "some over". */
  blurb: z.string(),
  portions: z.int(),
  /** The stack on show; empty where a sheet is proposed. */
  tiers: z.array(tier),
  sheet: z._default(z.nullable(sheet), null),
  cuttingCakes: z._default(z.array(cuttingCake), []),
  priceMinor: minor,
});
export type Proposal = z.infer<typeof proposal>;

/** How a coat fares in the setting; best first. */
export const coatRank = z.object({
  covering: coveringId,
  style: z.nullable(styleId),
  level: adviceLevel,
  sentence: z.string(),
});
export type CoatRank = z.infer<typeof coatRank>;

export const containedAllergen = z.object({
  ...allergenEntry.shape,
  /** Every part of the whole cake it comes from. */
  parts: z.array(z.string()),
});
export type ContainedAllergen = z.infer<typeof containedAllergen>;

/** One tier, the sheet, or one of a kind of cutting cake, as somebody lifts it. */
export const carriedPiece = z.object({
  kind: z.enum(['tier', 'sheet', 'cutting-cake']),
  /** From the board up, or into the cutting cakes. */
  index: z.int(),
  count: z.int(),
  weightG: z.int(),
});
export type CarriedPiece = z.infer<typeof carriedPiece>;

export const estimate = z.object({
  portions: z.object({
    wanted: z.int(),
    fed: z.int(),
    /** Per tier from the board up (a sheet has one entry); dummies and keepsakes are 0. */
    perTier: z.array(z.int()),
    /** Per kind of cutting cake, all of its count together. */
    perCuttingCake: z._default(z.array(z.int()), []),
  }),
  proposals: z.array(proposal),
  price,
  allergens: z.array(containedAllergen),
  handled: z.array(allergenEntry),
  ranks: z.array(coatRank),
  advice: z.array(advice),
  /** Grams, the whole cake on its board as carried, without cutting cakes; 0 before it exists. */
  weightG: z.int(),
  /** Grams of each piece as it is lifted: tiers on their cards from the board up, cutting cakes. */
  pieces: z._default(z.array(carriedPiece), []),
  /** Grams per part kind of the whole cake: what goes into it. */
  amounts: z.object({
    spongeG: z.int(),
    fillingG: z.int(),
    frostingG: z.int(),
    coveringG: z.int(),
  }),
  /** Millimetres with the board and what stands on top. */
  heightMm: z.int(),
  keepCool: z.string(),
});
export type Estimate = z.infer<typeof estimate>;
