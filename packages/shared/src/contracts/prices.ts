import * as z from 'zod/mini';
import { minor, slug } from './common.ts';
import { priceBook } from './menu.ts';

const pricesById = z.record(slug, minor);

/**
 * What a cake leaves in, by its widest side: one box for the whole cake and a board under each
 * tier. Smallest band first; a book without bands has not priced them, which is unknown, not free.
 */
export const packagingBand = z.object({ upToMm: z.int(), boxMinor: minor, boardMinor: minor });
export type PackagingBand = z.infer<typeof packagingBand>;

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
