import * as z from 'zod/mini';
import { id, instant, minor, slug } from './common.ts';
import { decoration, priceBook } from './menu.ts';
import { finishId } from './vocabulary.ts';

const pricesById = z.record(slug, minor);

/**
 * What a cake leaves in, by its widest side: one box for the whole cake and a board under each
 * tier. Smallest band first; a book without bands has not priced them, which is unknown, not free.
 */
const packagingBand = z.object({ upToMm: z.int(), boxMinor: minor, boardMinor: minor });

/**
 * Every price of the studio: what the public price book says, the surcharges and prices by
 * catalogue id (absent means none), and what only the owner sees. Fields with a default came
 * later than the first books.
 */
export const priceBookContent = z.object({
  ...z.omit(priceBook, { versionId: true }).shape,
  /** Per portion. */
  spongeSurcharges: pricesById,
  fillingSurcharges: pricesById,
  styleSurcharges: pricesById,
  coveringSurcharges: pricesById,
  /** Fixed by the owner; a decoration without one costs its minutes and materials. */
  decorationPrices: pricesById,
  /** What an hour of decorating sells for. */
  decoratingPerHourMinor: z._default(minor, 0),
  /** Put on top of what a decoration's materials cost. */
  materialsMarkupPpm: z._default(z.int(), 0),
  extraPrices: pricesById,
  /** What an hour of anybody's work costs the studio. */
  labourPerHourMinor: minor,
  overheadPpm: z.int(),
  /** The share of the net price the owner wants left: what a cake is measured against. */
  targetMarginPpm: z._default(z.int(), 250_000),
  packaging: z._default(z.array(packagingBand), []),
});
export type PriceBookContent = z.infer<typeof priceBookContent>;

const mostMinor = 1_000_000_000;
const amount = z
  .int('Write an amount.')
  .check(
    z.minimum(0, 'An amount is not below nothing.'),
    z.maximum(mostMinor, 'That is more than any cake.'),
  );
const amountsById = z.record(slug, amount);
const share = (mostPpm: number, most: string) =>
  z
    .int('Write a percentage.')
    .check(z.minimum(0, 'A percentage is not below nothing.'), z.maximum(mostPpm, most));
const whole = (least: number, most: number, message: string) =>
  z.int(message).check(z.minimum(least, message), z.maximum(most, message));
const width = whole(50, 1000, 'Write a width from 50 mm (2 in) to 1 m.');
const days = (least: number) => whole(least, 365, `Write a number of days from ${least} to 365.`);

/** Refuses a list that does not rise, at the entry that fails to. */
const rising =
  <Entry>(of: (entry: Entry) => number, field: string, message: string) =>
  ({ value, issues }: z.core.ParsePayload<Entry[]>): void => {
    for (const [index, entry] of value.entries()) {
      const before = value[index - 1];
      if (before !== undefined && of(entry) <= of(before)) {
        issues.push({ code: 'custom', path: [index, field], message, input: entry });
      }
    }
  };

const distinct =
  <Entry>(of: (entry: Entry) => string, field: string, message: string) =>
  ({ value, issues }: z.core.ParsePayload<Entry[]>): void => {
    for (const [index, entry] of value.entries()) {
      if (value.findIndex((it) => of(it) === of(entry)) < index) {
        issues.push({ code: 'custom', path: [index, field], message, input: entry });
      }
    }
  };

/** A price book as the owner may write it: the kept shape, within sense. */
export const priceBookForm = z.object({
  ...priceBookContent.shape,
  currency: z.string().check(z.regex(/^[A-Z]{3}$/, 'Write the three letters of ISO 4217: USD.')),
  tierBands: z.array(z.object({ upToMm: width, perPortionMinor: amount })).check(
    z.minLength(1, 'Tiers need at least one band.'),
    z.maxLength(12, 'At most 12 bands.'),
    rising((it) => it.upToMm, 'upToMm', 'Each band goes further than the one before.'),
  ),
  sheetPerPortionMinor: amount,
  dummyTierMinor: amount,
  finishes: z
    .array(z.object({ id: finishId, perPortionMinor: amount }))
    .check(distinct((it) => it.id, 'id', 'One price for each finish.')),
  wordsMinor: amount,
  minimumMinor: amount,
  rush: z
    .array(
      z.object({
        underDays: days(1),
        addPpm: share(5_000_000, 'At most 500 % more.'),
      }),
    )
    .check(
      z.maxLength(8, 'At most 8 bands.'),
      rising((it) => it.underDays, 'underDays', 'Each band is longer than the one before.'),
    ),
  taxes: z
    .array(
      z.object({
        category: slug,
        name: z
          .string()
          .check(
            z.trim(),
            z.minLength(1, 'Write the tax’s name.'),
            z.maxLength(60, 'At most 60 characters, please.'),
          ),
        ratePpm: share(1_000_000, 'At most 100 %.'),
      }),
    )
    .check(
      z.maxLength(8, 'At most 8 taxes.'),
      distinct((it) => it.category, 'category', 'One tax for each kind of goods.'),
    ),
  roundToMinor: whole(
    1,
    1_000_000,
    'Write the step to round to; the smallest coin rounds nothing.',
  ),
  depositPpm: share(1_000_000, 'At most 100 %.'),
  depositFloorMinor: amount,
  balanceDueDays: days(0),
  spongeSurcharges: amountsById,
  fillingSurcharges: amountsById,
  styleSurcharges: amountsById,
  coveringSurcharges: amountsById,
  decorationPrices: amountsById,
  decoratingPerHourMinor: amount,
  materialsMarkupPpm: share(10_000_000, 'At most 1000 %.'),
  extraPrices: amountsById,
  labourPerHourMinor: amount,
  overheadPpm: share(10_000_000, 'At most 1000 %.'),
  targetMarginPpm: share(990_000, 'Under 100 %: something has to be left for the cake.'),
  packaging: z.array(z.object({ upToMm: width, boxMinor: amount, boardMinor: amount })).check(
    z.maxLength(12, 'At most 12 bands.'),
    rising((it) => it.upToMm, 'upToMm', 'Each band goes further than the one before.'),
  ),
});

/** `PUT /api/staff/prices`: the whole book anew, written over the version it was made from. */
export const savePrices = z.object({ madeFrom: z.int(), content: priceBookForm });
export type SavePrices = z.infer<typeof savePrices>;

const named = z.object({ id: slug, name: z.string() });

/** `GET /api/staff/prices`: the book in force, what it prices by name, and the books before it. */
export const pricesView = z.object({
  n: z.int(),
  versionId: id,
  content: priceBookContent,
  /** Since the first order the currency stays. */
  currencyFixed: z.boolean(),
  sponges: z.array(named),
  fillings: z.array(named),
  styles: z.array(named),
  coverings: z.array(named),
  decorations: z.array(
    z.object({
      ...named.shape,
      per: decoration.shape.per,
      minutes: z.int(),
      materialsCostMinor: minor,
    }),
  ),
  extras: z.array(named),
  /** Newest first. */
  versions: z.array(
    z.object({
      n: z.int(),
      since: instant,
      /** Who saved it; null for the book the studio began with. */
      by: z.nullable(z.string()),
      /** Orders whose offer stands by it. */
      orders: z.int(),
    }),
  ),
});
export type PricesView = z.infer<typeof pricesView>;
