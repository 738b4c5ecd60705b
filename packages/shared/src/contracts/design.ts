import * as z from 'zod/mini';
import { colourHex, line, minuteOfDay, prose, slug } from './common.ts';
import {
  allergenId,
  coveringId,
  decorationSource,
  dietId,
  finishId,
  place,
  portionSizeId,
  severity,
  shape,
  styleId,
} from './vocabulary.ts';

/** What goes over a tier. Fondant and semi-naked lie over (or are) a buttercream; ganache has none. */
export const coating = z
  .object({
    covering: coveringId,
    style: z.nullable(styleId),
    finish: finishId,
    colour: z.nullable(colourHex),
  })
  .check(
    z.refine((it) => (it.covering === 'ganache' ? it.style === null : it.style !== null), {
      message: 'Choose the buttercream that goes with it.',
      path: ['style'],
    }),
  );
export type Coating = z.infer<typeof coating>;

/** One tier, millimetres. A dummy (`real: false`) has no sponge and no filling. */
export const tier = z
  .object({
    shape,
    widthMm: z
      .int()
      .check(
        z.minimum(100, 'At least 100 mm (4 in) across.'),
        z.maximum(400, 'At most 400 mm (16 in) across.'),
      ),
    depthMm: z
      .int()
      .check(
        z.minimum(100, 'At least 100 mm (4 in) deep.'),
        z.maximum(400, 'At most 400 mm (16 in) deep.'),
      ),
    heightMm: z
      .int()
      .check(
        z.minimum(75, 'At least 75 mm (3 in) high.'),
        z.maximum(180, 'At most 180 mm (7 in) high.'),
      ),
    /** Layers of sponge; fillings lie between them. */
    layers: z
      .int()
      .check(z.minimum(2, 'At least two layers.'), z.maximum(5, 'At most five layers.')),
    real: z.boolean(),
    keepsake: z.boolean(),
    spongeId: z.nullable(slug),
    fillingId: z.nullable(slug),
    /** Only where it differs from the cake's. */
    coating: z.nullable(coating),
  })
  .check(
    z.refine((it) => !it.real || it.spongeId !== null, {
      message: 'Choose a sponge for this tier.',
      path: ['spongeId'],
    }),
    z.refine((it) => !it.real || it.fillingId !== null, {
      message: 'Choose a filling for this tier.',
      path: ['fillingId'],
    }),
    z.refine((it) => it.shape === 'rectangle' || it.widthMm === it.depthMm, {
      message: 'A round or square tier is as deep as it is wide.',
      path: ['depthMm'],
    }),
  );
export type Tier = z.infer<typeof tier>;

/** A sheet cake of one of the studio's sizes. */
export const sheet = z.object({
  sizeId: slug,
  layers: z.int().check(z.minimum(1), z.maximum(3)),
  spongeId: z.nullable(slug).check(z.refine((it) => it !== null, 'Choose a sponge.')),
  fillingId: z.nullable(slug),
});
export type Sheet = z.infer<typeof sheet>;

/**
 * Plain sheets that stay in the kitchen and are cut there, to feed those whom the cake on show does
 * not. They are coated in the cake's own buttercream or ganache, smooth and untinted.
 */
export const cuttingCake = z.object({
  sizeId: slug,
  /** How many of this kind. */
  count: z
    .int('Write a whole number.')
    .check(z.minimum(1, 'At least one.'), z.maximum(100, 'At most 100 of one kind.')),
  layers: z.int().check(z.minimum(1), z.maximum(3)),
  spongeId: z.nullable(slug).check(z.refine((it) => it !== null, 'Choose a sponge.')),
  fillingId: z.nullable(slug),
});
export type CuttingCake = z.infer<typeof cuttingCake>;

/** The cake itself. Tiers are listed from the board upwards. */
export const cake = z
  .object({
    kind: z.enum(['tiered', 'sheet']),
    tiers: z.array(tier).check(z.maxLength(6, 'At most six tiers.')),
    sheet: z.nullable(sheet),
    coating: z.nullable(coating),
    cuttingCakes: z._default(
      z.array(cuttingCake).check(z.maxLength(6, 'At most six kinds of cutting cake.')),
      [],
    ),
  })
  .check(
    z.refine((it) => it.kind !== 'tiered' || it.tiers.length > 0, {
      message: 'Choose one of the cakes, or add a tier.',
      path: ['tiers'],
    }),
    z.refine((it) => it.kind !== 'sheet' || it.sheet !== null, {
      message: 'Choose the size of the sheet.',
      path: ['sheet'],
    }),
    z.refine(
      (it) =>
        it.kind !== 'tiered' ||
        it.tiers.length === 0 ||
        it.tiers.some((t) => t.real) ||
        it.cuttingCakes.length > 0,
      {
        message: 'At least one tier must be real cake, or a cutting cake must feed the guests.',
        path: ['tiers'],
      },
    ),
  );
export type Cake = z.infer<typeof cake>;

export const declaration = z
  .object({
    /** Null for something not on the list, told in words. */
    allergen: z.nullable(allergenId),
    /** Narrower than the allergen where the guest knows: `almond`, `wheat`. */
    species: z.nullable(slug),
    text: line(200),
    severity,
    guests: z.int().check(z.minimum(1, 'At least one guest.'), z.maximum(2000)),
  })
  .check(
    z.refine((it) => it.allergen !== null || it.text.trim() !== '', {
      message: 'Tell us what it is.',
      path: ['text'],
    }),
  );
export type Declaration = z.infer<typeof declaration>;

/** Who will eat it. */
export const guests = z.object({
  headCount: z
    .int('Write a whole number of people.')
    .check(
      z.minimum(1, 'Write how many people will eat, at least 1.'),
      z.maximum(2000, 'For more than 2,000 people please write to us first.'),
    ),
  occasionId: z.string().check(z.minLength(1, 'Choose the occasion.'), z.maxLength(60)),
  otherDesserts: z.boolean(),
  portionSizeId,
  allergies: z.array(declaration).check(z.maxLength(20, 'At most 20 entries; please write to us.')),
  diets: z.array(dietId).check(z.maxLength(6)),
  dietNote: line(300),
  /** Infants under twelve months at the table. */
  infants: z.boolean(),
  /** Pregnant, elderly, very young or immunocompromised guests. */
  susceptible: z.boolean(),
});
export type Guests = z.infer<typeof guests>;

/** Where the cake will stand. */
export const setting = z.object({
  place,
  /** The warmest it will get, °C; null is "don't know". */
  warmestC: z.nullable(
    z
      .number()
      .check(
        z.minimum(-10, 'That is colder than any table we know.'),
        z.maximum(50, 'That is hotter than any table we know.'),
      ),
  ),
  minutesOut: z.int().check(z.minimum(0), z.maximum(24 * 60, 'At most a day.')),
  driveMinutes: z.int().check(z.minimum(0), z.maximum(12 * 60, 'At most twelve hours.')),
  /** When it is cut, minutes since midnight where it stands; null while nobody knows. */
  servedAt: z._default(z.nullable(minuteOfDay), null),
});
export type Setting = z.infer<typeof setting>;

export const placedDecoration = z.object({
  decorationId: slug,
  /** Index into the tiers from the board up; null goes on the whole cake. */
  tier: z.nullable(z.int().check(z.minimum(0), z.maximum(5))),
  quantity: z.int().check(z.minimum(1, 'At least one.'), z.maximum(200, 'At most 200.')),
  colour: z.nullable(colourHex),
  source: decorationSource,
});
export type PlacedDecoration = z.infer<typeof placedDecoration>;

/** Words piped on one tier (or the sheet); spelled back before sending. */
export const words = z.object({
  tier: z.int().check(z.minimum(0), z.maximum(5)),
  text: line(80),
});

export const look = z.object({
  palette: z.array(colourHex).check(z.maxLength(5, 'At most five colors.')),
  words: z.array(words).check(z.maxLength(6)),
  decorations: z.array(placedDecoration).check(z.maxLength(40, 'At most 40 decorations.')),
  note: prose(2000),
});
export type Look = z.infer<typeof look>;

export const extra = z.object({
  extraId: slug,
  quantity: z.int().check(z.minimum(1), z.maximum(200, 'At most 200.')),
});
export type Extra = z.infer<typeof extra>;

/** A whole design as it is priced, advised on and planned. Null parts are not chosen yet. */
export const design = z.object({
  guests,
  cake: z.nullable(cake),
  setting: z.nullable(setting),
  look: z.nullable(look),
  extras: z.array(extra).check(z.maxLength(20)),
});
export type Design = z.infer<typeof design>;
