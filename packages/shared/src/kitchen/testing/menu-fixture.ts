import { usualKitchen } from '#shared/contracts/kitchen-rules.ts';
import type { Menu, TierSize } from '#shared/contracts/menu.ts';
import { egg, entry, milk, soy, wheat } from './contents-fixture.ts';
import { coverings, decorations, fillings, sponges, styles } from './menu-parts-fixture.ts';

/** Inches to whole millimetres, as the studio keeps its tins. */
export const inches = (value: number): number => Math.round(value * 25.4);

const heightsMm = [3, 4, 5, 6, 7].map(inches);

const even = (shape: 'round' | 'square', across: number): TierSize => ({
  shape,
  widthMm: inches(across),
  depthMm: inches(across),
  heightsMm,
});

/** A whole menu of the invented studio, for tests. Prices are US cents. */
export const menuFixture: Menu = {
  version: 'fixture-1',
  studio: {
    name: 'Oxbow Lane Cake Studio',
    street: '14 Oxbow Lane',
    town: 'Alder Falls',
    region: 'NY',
    postcode: '13999',
    country: 'US',
    phone: '+1 607 555 0114',
    email: 'hello@oxbowlane.example',
    zone: 'America/New_York',
    currency: 'USD',
    labelRegion: 'US',
    temperatureLead: 'F',
    lengthLead: 'in',
    locale: 'en-US',
    answerHours: 48,
    guestHoldMinutes: 30,
    bookOpenMonths: 18,
    monthlyWarmestC: [4, 6, 11, 18, 24, 28, 31, 30, 26, 19, 12, 6],
    dessertFactorPpm: 700_000,
    kitchenNotice: 'Everything here is made in one kitchen.',
    homeKitchenText: 'Made at 14 Oxbow Lane, Alder Falls.',
    eggAdvisory: 'Eating raw or undercooked egg may raise the risk of illness.',
    handles: [wheat, egg, milk, soy, entry('tree-nuts', ['almond', 'hazelnut']), entry('sesame')],
  },
  portionSizes: [
    { id: 'coffee', name: 'Coffee', widthMm: 25, depthMm: 25, blurb: 'Two bites.' },
    { id: 'dessert', name: 'Dessert', widthMm: 25, depthMm: 50, blurb: 'A slim slice.' },
    { id: 'party', name: 'Party', widthMm: 38, depthMm: 50, blurb: 'A proper slice.' },
  ],
  occasions: [
    { id: 'wedding', name: 'Wedding' },
    { id: 'birthday', name: 'Birthday' },
  ],
  tierSizes: [
    ...[4, 5, 6, 7, 8, 9, 10, 12, 14].map((across) => even('round', across)),
    ...[4, 6, 8, 10, 12].map((across) => even('square', across)),
    { shape: 'rectangle', widthMm: inches(12), depthMm: inches(8), heightsMm: [inches(4)] },
  ],
  sheetSizes: [
    { id: 'quarter', name: 'Quarter sheet, 9 x 13 in', widthMm: 330, depthMm: 229, heightMm: 50 },
    { id: 'half', name: 'Half sheet, 13 x 18 in', widthMm: 457, depthMm: 330, heightMm: 50 },
    { id: 'full', name: 'Full sheet, 18 x 26 in', widthMm: 660, depthMm: 457, heightMm: 50 },
  ],
  sponges,
  fillings,
  styles,
  coverings,
  decorations,
  extras: [
    { id: 'candles', name: 'Candles, a box of 12', blurb: 'Thin tapers.', priceMinor: 450 },
    { id: 'knife', name: 'Cake knife', blurb: 'Lent for a week.', priceMinor: 600 },
  ],
  priceBook: {
    versionId: 'price-book-1',
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
      { category: 'cake', name: 'Tax on cakes', ratePpm: 0 },
      { category: 'goods', name: 'Sales tax on goods', ratePpm: 88_750 },
    ],
    roundToMinor: 50,
    depositPpm: 300_000,
    depositFloorMinor: 5000,
    balanceDueDays: 7,
  },
  allergyRules: [
    { allergen: null, severity: 'avoids', answer: 'take' },
    { allergen: null, severity: 'intolerance', answer: 'talk' },
    { allergen: null, severity: 'coeliac', answer: 'refuse' },
    { allergen: null, severity: 'allergy', answer: 'talk' },
    { allergen: null, severity: 'anaphylaxis', answer: 'refuse' },
    { allergen: 'tree-nuts', severity: 'allergy', answer: 'refuse' },
  ],
  policies: [
    {
      kind: 'allergy',
      versionId: 'allergy-1',
      title: 'Allergies',
      text: 'We tell you what is in your cake and what else we handle.',
      since: '2026-01-01',
    },
  ],
  kitchen: usualKitchen,
  wordsPer100Mm: 13,
  maxPhotos: 8,
};
