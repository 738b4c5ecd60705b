import type { AllergenId, Severity } from '#shared/contracts/vocabulary.ts';

/** The demo's studio; it exists nowhere. The telephone is in the range kept for fiction. */
export const studio = {
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
  locale: 'en-US',
  labelRegion: 'US',
  temperatureLead: 'F',
  lengthLead: 'in',
  altitudeM: 260,
  /** The warmest hour by month, °C, from the studio's own notebook. */
  monthlyWarmestC: [4, 6, 11, 18, 24, 28, 31, 30, 26, 19, 12, 6],
  defaultPortionSizeId: 'dessert',
  kitchen: {},
  kitchenNotice:
    'Everything here is made in one kitchen. We tell you what is in your cake and what else we handle; we cannot promise that a trace of the rest is not in it. If an allergy at your table is serious, please talk to us before you order, and ask your doctor what is right for you.',
  homeKitchenText:
    'Made in a licensed commercial kitchen at 14 Oxbow Lane, Alder Falls. Local food rules apply to us and to you: ask us for our license if you need it.',
  eggAdvisory:
    'Eating raw or undercooked egg may raise the risk of illness, above all for young children, older people, pregnant people and anyone whose defenses are low.',
} as const;

/** What the owner says beyond the ingredients, with the assessment it rests on. */
export const kitchenAllergens: readonly {
  readonly allergen: AllergenId;
  /** Added to what the ingredients show; they name the kinds of nuts by themselves. */
  readonly handled: boolean;
  readonly assessment: string | null;
}[] = [
  {
    allergen: 'sesame',
    handled: true,
    assessment: 'Sesame crackers are baked here for the Sunday market.',
  },
  {
    allergen: 'tree-nuts',
    handled: false,
    assessment:
      'Ground nuts are weighed on the main bench; flour dust and nut dust cannot be kept apart within a day.',
  },
  {
    allergen: 'peanut',
    handled: false,
    assessment: 'No peanuts are bought, and staff bring none in. Checked against every label.',
  },
];

/**
 * What the owner answers when the cake contains it: take, take after talking, refuse. A rule with
 * no allergen holds for all that have none of their own.
 */
export const allergyRules: readonly {
  readonly allergen: AllergenId | null;
  readonly severity: Severity;
  readonly answer: 'take' | 'talk' | 'refuse';
}[] = [
  { allergen: null, severity: 'avoids', answer: 'take' },
  { allergen: null, severity: 'intolerance', answer: 'talk' },
  { allergen: null, severity: 'coeliac', answer: 'refuse' },
  { allergen: null, severity: 'allergy', answer: 'talk' },
  { allergen: null, severity: 'anaphylaxis', answer: 'refuse' },
  { allergen: 'peanut', severity: 'allergy', answer: 'refuse' },
  { allergen: 'tree-nuts', severity: 'allergy', answer: 'refuse' },
];
