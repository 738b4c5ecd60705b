import type { PriceBookContent } from '#shared/contracts/prices.ts';

/**
 * The first price book, US cents. Cakes are not taxed as bakery food sold cold to take away;
 * candles and other goods are, at 8 %: the owner checks both with an adviser. No deposit is asked
 * until payments can be taken.
 */
export const firstPriceBook: PriceBookContent = {
  currency: 'USD',
  tierBands: [
    { upToMm: 160, perPortionMinor: 540 },
    { upToMm: 260, perPortionMinor: 500 },
    { upToMm: 400, perPortionMinor: 480 },
  ],
  sheetPerPortionMinor: 320,
  dummyTierMinor: 2500,
  finishes: [
    { id: 'smooth', perPortionMinor: 0 },
    { id: 'textured', perPortionMinor: 25 },
    { id: 'piped', perPortionMinor: 120 },
  ],
  wordsMinor: 1200,
  minimumMinor: 6500,
  rush: [
    { underDays: 4, addPpm: 250_000 },
    { underDays: 8, addPpm: 100_000 },
  ],
  taxInclusive: false,
  taxes: [
    { category: 'cake', name: 'Bakery food to take away', ratePpm: 0 },
    { category: 'goods', name: 'Sales tax on goods', ratePpm: 80_000 },
  ],
  roundToMinor: 50,
  depositPpm: 0,
  depositFloorMinor: 0,
  balanceDueDays: 7,
  spongeSurcharges: { honey: 20, chocolate: 15, carrot: 35, almond: 60, 'orange-chiffon': 20 },
  fillingSurcharges: {
    'lemon-curd': 30,
    'passion-fruit': 40,
    'vanilla-cream': 20,
    'salted-caramel': 30,
    'chocolate-cream': 30,
    hazelnut: 60,
    pistachio: 85,
    'cream-cheese': 30,
  },
  styleSurcharges: { swiss: 40, italian: 50, french: 50, german: 45, russian: 20 },
  coveringSurcharges: { fondant: 120, ganache: 80 },
  // The rest are priced by their minutes and materials; bought flowers vary, so theirs is fixed.
  decorationPrices: { 'fresh-flowers': 2400 },
  decoratingPerHourMinor: 4200,
  materialsMarkupPpm: 333_333,
  extraPrices: {
    candles: 450,
    'number-candle': 350,
    sparkler: 500,
    'cake-knife': 600,
    'cutting-kit': 700,
    'cake-stand': 3200,
    'spare-buttercream': 800,
  },
  labourPerHourMinor: 3200,
  overheadPpm: 180_000,
  targetMarginPpm: 250_000,
  packaging: [
    { upToMm: 160, boxMinor: 140, boardMinor: 60 },
    { upToMm: 260, boxMinor: 260, boardMinor: 110 },
    { upToMm: 400, boxMinor: 480, boardMinor: 240 },
    { upToMm: 660, boxMinor: 720, boardMinor: 420 },
  ],
};
