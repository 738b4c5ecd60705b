import * as z from 'zod/mini';
import { colourHex, id, localDate, minor, slug } from './common.ts';
import { kitchenRules } from './kitchen-rules.ts';
import {
  allergenId,
  allergenState,
  coveringId,
  decorationEdge,
  decorationSource,
  detail,
  finishId,
  labelRegion,
  portionSizeId,
  shape,
  styleId,
} from './vocabulary.ts';

/** One allergen of a part, worked out from its ingredients; never typed per product. */
export const allergenEntry = z.object({
  allergen: allergenId,
  species: z.array(z.string()),
  state: allergenState,
});
export type AllergenEntry = z.infer<typeof allergenEntry>;

/** What a part of a cake has in it, through all its formulas. */
export const contents = z.object({
  allergens: z.array(allergenEntry),
  /** Ingredient statement, heaviest first, by common name. */
  statement: z.string(),
  gelatine: z.boolean(),
  alcohol: z.boolean(),
  cochineal: z.boolean(),
  /** Honey matters for infants. */
  honey: z.boolean(),
  /** Meat, fish or slaughter products (gelatine of unknown origin counts). */
  animalOrigin: z.boolean(),
  /** Any egg not known to be pasteurised or cooked to its limit. */
  undercookedEgg: z.boolean(),
});
export type Contents = z.infer<typeof contents>;

export const studioCard = z.object({
  name: z.string(),
  street: z.string(),
  town: z.string(),
  region: z.string(),
  postcode: z.string(),
  country: z.string(),
  phone: z.string(),
  email: z.string(),
  /** IANA zone name. */
  zone: z.string(),
  /** ISO 4217. */
  currency: z.string(),
  labelRegion,
  temperatureLead: z.enum(['F', 'C']),
  lengthLead: z.enum(['in', 'cm']),
  locale: z.string(),
  answerHours: z.int(),
  guestHoldMinutes: z.int(),
  bookOpenMonths: z.int(),
  /** The studio's own figure for the warmest hour by month, °C, January first. */
  monthlyWarmestC: z.array(z.number()),
  /** Head counts are multiplied by this (parts per million) when other desserts are served. */
  dessertFactorPpm: z.int(),
  kitchenNotice: z.string(),
  homeKitchenText: z.string(),
  /** The advisory for egg that is neither pasteurised nor cooked to its limit; local code decides. */
  eggAdvisory: z._default(z.string(), ''),
  /** What the kitchen handles: union over active ingredients plus the owner's additions. */
  handles: z.array(allergenEntry),
});
export type StudioCard = z.infer<typeof studioCard>;

export const portionSize = z.object({
  id: portionSizeId,
  name: z.string(),
  widthMm: z.int(),
  depthMm: z.int(),
  blurb: z.string(),
});
export type PortionSize = z.infer<typeof portionSize>;

export const tierSize = z.object({
  shape,
  widthMm: z.int(),
  depthMm: z.int(),
  heightsMm: z.array(z.int()),
});
export type TierSize = z.infer<typeof tierSize>;

export const sheetSize = z.object({
  id: slug,
  name: z.string(),
  widthMm: z.int(),
  depthMm: z.int(),
  heightMm: z.int(),
});
export type SheetSize = z.infer<typeof sheetSize>;

/** Sponge or filling as the public sees it. Densities in g/mL, losses in parts per million. */
export const sponge = z.object({
  id: slug,
  name: z.string(),
  blurb: z.string(),
  colour: colourHex,
  contents,
  densityGPerMl: z.number(),
  bakeLossPpm: z.int(),
  levellingPpm: z.int(),
  surchargePerPortionMinor: minor,
});
export type Sponge = z.infer<typeof sponge>;

export const filling = z.object({
  id: slug,
  name: z.string(),
  blurb: z.string(),
  colour: colourHex,
  contents,
  densityGPerMl: z.number(),
  thicknessMm: z.number(),
  /** Needs a dam of frosting. */
  soft: z.boolean(),
  /** Warmest the filling holds under a stacked tier, °C. */
  holdsToC: z.number(),
  surchargePerPortionMinor: minor,
});
export type Filling = z.infer<typeof filling>;

export const buttercreamStyle = z.object({
  id: styleId,
  name: z.string(),
  blurb: z.string(),
  how: z.string(),
  bestFor: z.string(),
  /** 1 to 5. */
  sweetness: z.int(),
  /** 1 to 5: how smooth a coat it makes. */
  smoothness: z.int(),
  colour: colourHex,
  holdsToC: z.number(),
  detail,
  crusts: z.boolean(),
  /** Needs cold holding unless the owner has a tested reason otherwise. */
  refrigerate: z.boolean(),
  contents,
  densityGPerMl: z.number(),
  surchargePerPortionMinor: minor,
});
export type ButtercreamStyle = z.infer<typeof buttercreamStyle>;

export const covering = z.object({
  id: coveringId,
  name: z.string(),
  blurb: z.string(),
  colour: colourHex,
  holdsToC: z.number(),
  detail,
  finishes: z.array(finishId),
  /** Contents of the covering alone; a buttercream under it adds its own. */
  contents,
  densityGPerMl: z.number(),
  thicknessMm: z.number(),
  surchargePerPortionMinor: minor,
});
export type Covering = z.infer<typeof covering>;

export const decoration = z.object({
  id: slug,
  name: z.string(),
  blurb: z.string(),
  /** Which of our drawn figures stands for it. */
  glyph: z.enum([
    'flower',
    'leaf',
    'pearl',
    'border',
    'figure',
    'topper',
    'fruit',
    'drip',
    'print',
    'ribbon',
    'sprinkle',
  ]),
  edge: decorationEdge,
  sources: z.array(decorationSource),
  needs: detail,
  priceMinor: minor,
  /** Priced each, or once for a tier or the whole cake. */
  per: z.enum(['piece', 'tier', 'cake']),
  minutes: z.int(),
  madeAhead: z.boolean(),
  /** How long it keeps once made; null where the studio has not said. */
  keepsDays: z._default(z.nullable(z.int()), null),
  skill: z.nullable(z.string()),
  noticeDays: z.int(),
  weightG: z.int(),
  /** Caution to show wherever it is chosen, empty if none. */
  caution: z.string(),
  smallParts: z.boolean(),
  contents,
});
export type Decoration = z.infer<typeof decoration>;

export const extraItem = z.object({
  id: slug,
  name: z.string(),
  blurb: z.string(),
  priceMinor: minor,
  /** Category in the price book's taxes; without one it is taxed as goods. */
  taxCategory: z.optional(slug),
});
export type ExtraItem = z.infer<typeof extraItem>;

/** What the price needs of the price book; minor units throughout. */
export const priceBook = z.object({
  versionId: id,
  currency: z.string(),
  /** Per portion by the widest side of the tier, smallest band first. */
  tierBands: z.array(z.object({ upToMm: z.int(), perPortionMinor: minor })),
  sheetPerPortionMinor: minor,
  dummyTierMinor: minor,
  finishes: z.array(z.object({ id: finishId, perPortionMinor: minor })),
  wordsMinor: minor,
  minimumMinor: minor,
  /** Notice in whole days; the first band that covers it adds this share of the lines so far. */
  rush: z.array(z.object({ underDays: z.int(), addPpm: z.int() })),
  taxInclusive: z.boolean(),
  /** Rates in parts per million by category. */
  taxes: z.array(z.object({ category: slug, name: z.string(), ratePpm: z.int() })),
  /** Totals are rounded to a multiple of this. */
  roundToMinor: z.int(),
  depositPpm: z.int(),
  depositFloorMinor: minor,
  balanceDueDays: z.int(),
});
export type PriceBook = z.infer<typeof priceBook>;

export const allergyAnswer = z.enum(['take', 'talk', 'refuse']);
export type AllergyAnswer = z.infer<typeof allergyAnswer>;

/** The owner's word per allergen and severity when the cake contains it. */
export const allergyRule = z.object({
  allergen: z.nullable(allergenId),
  severity: z.string(),
  answer: allergyAnswer,
});
export type AllergyRule = z.infer<typeof allergyRule>;

export const policyText = z.object({
  kind: z.enum(['privacy', 'terms', 'allergy', 'cancellation', 'photo']),
  versionId: id,
  title: z.string(),
  text: z.string(),
  since: localDate,
});
export type PolicyText = z.infer<typeof policyText>;

/** All a visitor, the wizard and the pure rules need; the same for everyone. */
export const menu = z.object({
  version: z.string(),
  studio: studioCard,
  portionSizes: z.array(portionSize),
  occasions: z.array(z.object({ id: slug, name: z.string() })),
  tierSizes: z.array(tierSize),
  sheetSizes: z.array(sheetSize),
  sponges: z.array(sponge),
  fillings: z.array(filling),
  styles: z.array(buttercreamStyle),
  coverings: z.array(covering),
  decorations: z.array(decoration),
  extras: z.array(extraItem),
  priceBook,
  allergyRules: z.array(allergyRule),
  policies: z.array(policyText),
  /** The kitchen's own figures, which all amounts, proposals and advice go by. */
  kitchen: kitchenRules,
  /** Words piped on a tier fit this many characters per 100 mm of its width. */
  wordsPer100Mm: z.int(),
  maxPhotos: z.int(),
});
export type Menu = z.infer<typeof menu>;
