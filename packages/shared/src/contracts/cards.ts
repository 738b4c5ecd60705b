import * as z from 'zod/mini';
import { id, localDate, minuteOfDay, slug } from './common.ts';
import { cake, look } from './design.ts';
import { allergenEntry } from './menu.ts';
import { allergenId, labelRegion, portionSizeId } from './vocabulary.ts';

/** Labels of a cake, the care card that goes home with it, and the page about it alone. */

/** A stretch of a label's text; the EU and the UK want allergens to stand out in the list. */
export const labelSegment = z.object({ text: z.string(), emphasised: z.boolean() });
export type LabelSegment = z.infer<typeof labelSegment>;

/** Everything one label says, in the order it is printed; null or empty where there is nothing. */
export const labelText = z.object({
  /** `cake`, or `cutting-cake-0` and on. */
  id: slug,
  /** Boxes that want one. */
  copies: z.int(),
  region: labelRegion,
  studio: z.object({ name: z.string(), address: z.string() }),
  product: z.string(),
  /** "For a wedding, No. 2421". */
  about: z.string(),
  ingredients: z.array(labelSegment),
  contains: z.nullable(z.string()),
  signpost: z.nullable(z.string()),
  notKnown: z.array(z.string()),
  mayContain: z.nullable(z.string()),
  makersWarn: z.nullable(z.string()),
  kitchen: z.nullable(z.string()),
  net: z.object({
    grams: z.number(),
    text: z.string(),
    /** Off the scale; otherwise worked out from the design. */
    weighed: z.boolean(),
  }),
  madeOn: z.nullable(localDate),
  useBy: z.nullable(localDate),
  /** How to keep it. */
  keep: z.array(z.string()),
  /** What comes out or off before eating. */
  remove: z.array(z.string()),
  cautions: z.array(z.string()),
  homeKitchen: z.string(),
  /** The smallest type the law lets it be set in: height of a small letter, and of the net weight. */
  smallestXHeightMm: z.number(),
  smallestFigureMm: z.number(),
});
export type LabelText = z.infer<typeof labelText>;

/** Why a label cannot be printed yet. */
export const labelReason = z.object({
  code: z.enum([
    'not-confirmed',
    'no-cake',
    'unknown-allergen',
    'brought',
    'kind-not-told',
    'shelf-life',
    'address',
  ]),
  sentence: z.string(),
  /** The bought product it is about, to go and read its label. */
  ingredientId: z.nullable(id),
  formulaId: z.nullable(id),
  /** The owner may let it be printed as "not known". */
  confirmable: z.boolean(),
});
export type LabelReason = z.infer<typeof labelReason>;

/** `GET /api/staff/orders/:number/labels`: what will be printed, and what keeps it from it. */
export const orderLabels = z.object({
  labels: z.array(labelText),
  reasons: z.array(labelReason),
  /** To be checked by whoever prints: nothing here stops it. */
  reminders: z.array(z.string()),
  /** The owner has said that what is not known may be printed so. */
  unknownConfirmed: z.boolean(),
  /** Of the page about the cake; null before the order is confirmed. */
  careCode: z.nullable(z.string()),
  servedAt: z.nullable(minuteOfDay),
  can: z.object({
    printLabels: z.boolean(),
    printCareCard: z.boolean(),
    confirmUnknown: z.boolean(),
  }),
});
export type OrderLabels = z.infer<typeof orderLabels>;

export const labelPapers = ['single', 'a4', 'letter'] as const;
export const labelPaper = z.enum(labelPapers);
export type LabelPaper = z.infer<typeof labelPaper>;

/** Labels on a sheet, across and down. */
export const labelsPerSheet = { single: 1, a4: 8, letter: 6 } as const satisfies Record<
  LabelPaper,
  number
>;

/** `GET .../labels.pdf` */
export const printLabelsQuery = z.object({
  paper: labelPaper,
  /** The first free place on a sheet, from 1. */
  start: z.optional(z.int().check(z.minimum(1), z.maximum(8, 'There are at most eight places.'))),
  /** Which label; all of them without. */
  label: z.optional(z.string().check(z.maxLength(40))),
  copies: z.optional(z.int().check(z.minimum(1), z.maximum(40, 'At most 40 copies at once.'))),
  /** Off the scale, whole grams; for one label alone. */
  weighedG: z.optional(
    z.int().check(z.minimum(1, 'Write the grams on the scale.'), z.maximum(200_000)),
  ),
});
export type PrintLabelsQuery = z.infer<typeof printLabelsQuery>;

export const cardPaper = z.enum(['a5', 'half-letter']);
export type CardPaper = z.infer<typeof cardPaper>;

/** `GET .../care-card.pdf` */
export const careCardQuery = z.object({
  paper: z.optional(cardPaper),
  /** When it will be cut, minutes since midnight; what the order says where it is left out. */
  servedAt: z.optional(minuteOfDay),
});
export type CareCardQuery = z.infer<typeof careCardQuery>;

/** `POST /api/staff/orders/:number/labels/confirm-unknown` */
export const confirmUnknown = z.object({
  /** What the owner saw, word for word; anything else is asked again. */
  sentences: z.array(z.string().check(z.maxLength(2000))).check(z.maxLength(200)),
});

/** One part of the cake with what it is made of. */
export const carePart = z.object({
  name: z.string(),
  statement: z.string(),
  contains: z.array(z.string()),
});

/**
 * `GET /api/care/:code`: the page about the cake alone. No name, no words, no price, no contact of
 * whoever ordered it.
 */
export const cakeCare = z.object({
  product: z.string(),
  cake: z.nullable(cake),
  /** Colours and decorations; words on the cake and notes are left out. */
  look: z.nullable(look),
  portionSizeId,
  portions: z.object({ fed: z.int(), perTier: z.array(z.int()), each: z.string() }),
  label: labelText,
  parts: z.array(carePart),
  handled: z.array(allergenEntry),
  /** Allergens beyond the region's list that are in it all the same. */
  alsoIn: z.array(z.object({ allergen: allergenId, text: z.string() })),
  keepCool: z.string(),
  pickupOn: localDate,
});
export type CakeCare = z.infer<typeof cakeCare>;
