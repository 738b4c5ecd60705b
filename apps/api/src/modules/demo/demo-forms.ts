import type { Coating, Tier } from '#shared/contracts/design.ts';
import type { SubmitOrder } from '#shared/contracts/orders.ts';

/** A form without its day, which is chosen from those that are open. */
export type DemoForm = Omit<SubmitOrder, 'photos' | 'seenTotalMinor' | 'askWithoutDate' | 'day'> & {
  readonly day: Omit<SubmitOrder['day'], 'date' | 'windowStart'>;
};

type Guests = Partial<DemoForm['day']> & Pick<DemoForm['day'], 'headCount' | 'occasionId'>;

const coat = (style: Coating['style'], changes: Partial<Coating> = {}): Coating => ({
  covering: 'buttercream',
  style,
  finish: 'smooth',
  colour: null,
  ...changes,
});

const round = (
  inches: number,
  spongeId: string,
  fillingId: string,
  changes: Partial<Tier> = {},
): Tier => ({
  shape: 'round',
  widthMm: Math.round(inches * 25.4),
  depthMm: Math.round(inches * 25.4),
  heightMm: 102,
  layers: 3,
  real: true,
  keepsake: false,
  spongeId,
  fillingId,
  coating: null,
  ...changes,
});

const guestsOf = (guests: Guests): DemoForm['day'] => ({
  otherDesserts: false,
  portionSizeId: 'dessert',
  allergies: [],
  diets: [],
  dietNote: '',
  infants: false,
  susceptible: false,
  ...guests,
});

const tiered = (coating: Coating, ...tiers: Tier[]): SubmitOrder['cake'] => ({
  kind: 'tiered',
  tiers,
  sheet: null,
  coating,
});

const placed = (
  decorationId: string,
  tier: number | null,
  quantity = 1,
  colour: string | null = null,
): SubmitOrder['look']['decorations'][number] => ({
  decorationId,
  tier,
  quantity,
  colour,
  source: decorationId === 'fresh-flowers' ? 'florist' : 'studio',
});

const look = (changes: Partial<SubmitOrder['look']>): SubmitOrder['look'] => ({
  palette: [],
  words: [],
  decorations: [],
  note: '',
  ...changes,
});

const person = (name: string, email: string, phone = ''): SubmitOrder['you'] => ({
  name,
  email,
  phone,
  reachBy: 'email',
  otherCollects: false,
  collectorName: '',
  collectorPhone: '',
});

const indoors: SubmitOrder['setting'] = {
  place: 'indoors',
  warmestC: 21,
  minutesOut: 60,
  driveMinutes: 15,
};
const agreed: SubmitOrder['consents'] = { policies: true, allergyData: false, showPhotos: false };

/** What the demo's customers ordered. All of them are invented. */
export const demoForms = {
  firstBirthday: {
    day: guestsOf({
      headCount: 14,
      occasionId: 'child-birthday',
      portionSizeId: 'party',
      infants: true,
    }),
    cake: tiered(coat('swiss', { colour: '#f6d9e0' }), round(8, 'vanilla', 'strawberry')),
    setting: indoors,
    look: look({
      palette: ['#f6d9e0', '#ffffff'],
      words: [{ tier: 0, text: 'Nell is one' }],
      decorations: [placed('sprinkles', 0)],
    }),
    extras: [{ extraId: 'number-candle', quantity: 1 }],
    you: person('Mabel Osei', 'mabel.osei@example.com', '607 555 0121'),
    consents: { ...agreed, showPhotos: true },
  },
  retirement: {
    day: guestsOf({ headCount: 54, occasionId: 'retirement', otherDesserts: true }),
    cake: {
      kind: 'sheet',
      tiers: [],
      sheet: { sizeId: 'half', layers: 2, spongeId: 'chocolate', fillingId: 'salted-caramel' },
      coating: coat('american', { finish: 'piped' }),
    },
    setting: indoors,
    look: look({
      words: [{ tier: 0, text: 'Fair winds, Captain Whitlock' }],
      decorations: [placed('piped-border', 0)],
      note: 'A small sailing boat somewhere would be lovely.',
    }),
    extras: [],
    you: person('Rosa Whitlock', 'rosa.whitlock@example.com', '607 555 0142'),
    consents: agreed,
  },
  anniversary: {
    day: guestsOf({ headCount: 40, occasionId: 'anniversary' }),
    cake: tiered(
      coat('italian'),
      round(10, 'lemon', 'raspberry'),
      round(7, 'vanilla', 'raspberry'),
    ),
    setting: { place: 'shade', warmestC: 24, minutesOut: 90, driveMinutes: 20 },
    look: look({
      palette: ['#2c7a4b', '#ffffff'],
      decorations: [placed('pressed-flowers', 0), placed('fine-lace', 1)],
    }),
    extras: [{ extraId: 'cake-stand', quantity: 1 }],
    you: person('Tomas Adair', 'tomas.adair@example.com', '607 555 0155'),
    consents: agreed,
  },
  wedding: {
    day: guestsOf({ headCount: 70, occasionId: 'wedding' }),
    cake: tiered(
      coat('italian'),
      round(10, 'lemon', 'raspberry'),
      round(8, 'vanilla', 'passion-fruit'),
      round(5, 'honey', 'lemon-curd'),
    ),
    setting: { place: 'shade', warmestC: 25, minutesOut: 90, driveMinutes: 25 },
    look: look({
      palette: ['#faf6ec', '#f2b632', '#2c7a4b'],
      decorations: [
        placed('sugar-flower', 0, 3, '#f2b632'),
        placed('sugar-flower', 1, 2, '#f2b632'),
        placed('sugar-leaves', 0, 2, '#2c7a4b'),
      ],
      note: 'Like poppies in a barley field; loose rather than neat.',
    }),
    extras: [{ extraId: 'cake-knife', quantity: 1 }],
    you: {
      ...person('Tessa Marchetti', 'tessa.marchetti@example.com', '607 555 0160'),
      otherCollects: true,
      collectorName: 'Luca Marchetti',
      collectorPhone: '607 555 0161',
    },
    consents: { ...agreed, showPhotos: true },
  },
  graduation: {
    day: guestsOf({ headCount: 24, occasionId: 'graduation', diets: ['no-alcohol'] }),
    cake: tiered(coat(null, { covering: 'ganache' }), round(10, 'chocolate', 'chocolate-cream')),
    setting: { ...indoors, minutesOut: 45 },
    look: look({
      decorations: [placed('hand-lettering', 0), placed('gold-leaf', 0)],
      words: [{ tier: 0, text: 'Dr. Venkat' }],
    }),
    extras: [],
    you: person('Priya Venkat', 'priya.venkat@example.com', '607 555 0177'),
    consents: agreed,
  },
  carrot: {
    day: guestsOf({ headCount: 16, occasionId: 'birthday' }),
    cake: tiered(coat('russian', { finish: 'textured' }), round(8, 'carrot', 'cream-cheese')),
    setting: indoors,
    look: look({
      decorations: [placed('figure', 0, 1, '#d97b29')],
      note: 'A rabbit, please, with one ear down.',
    }),
    extras: [{ extraId: 'candles', quantity: 1 }],
    you: person('Henrik Solberg', 'henrik.solberg@example.com'),
    consents: agreed,
  },
  gardenParty: {
    day: guestsOf({ headCount: 30, occasionId: 'company' }),
    cake: tiered(
      coat('french'),
      round(9, 'orange-chiffon', 'vanilla-cream'),
      round(6, 'orange-chiffon', 'vanilla-cream'),
    ),
    setting: { place: 'sun', warmestC: 29, minutesOut: 150, driveMinutes: 40 },
    look: look({ decorations: [placed('fresh-fruit', 0)] }),
    extras: [],
    you: person('Odile Fenn', 'odile.fenn@example.com', '607 555 0183'),
    consents: agreed,
  },
  secondThoughts: {
    day: guestsOf({ headCount: 12, occasionId: 'birthday' }),
    cake: tiered(coat('german', { covering: 'semi-naked' }), round(6, 'honey', 'strawberry')),
    setting: indoors,
    look: look({}),
    extras: [],
    you: person('Ansel Brook', 'ansel.brook@example.com'),
    consents: agreed,
  },
  eggAllergy: {
    day: guestsOf({
      headCount: 40,
      occasionId: 'baby',
      allergies: [
        { allergen: 'egg', species: null, text: '', severity: 'allergy', guests: 1 },
        {
          allergen: null,
          species: null,
          text: 'strawberries bring a rash',
          severity: 'intolerance',
          guests: 1,
        },
      ],
    }),
    cake: tiered(
      coat('swiss', { colour: '#dbe9f4' }),
      round(9, 'almond', 'raspberry'),
      round(7, 'almond', 'raspberry'),
    ),
    setting: indoors,
    look: look({ palette: ['#dbe9f4', '#ffffff'], decorations: [placed('pearls', 0)] }),
    extras: [],
    you: person('Ines Castellan', 'ines.castellan@example.com', '607 555 0198'),
    consents: { ...agreed, allergyData: true },
  },
  smallAmerican: {
    day: guestsOf({ headCount: 12, occasionId: 'birthday' }),
    cake: tiered(coat('american', { finish: 'piped' }), round(6, 'vanilla', 'raspberry')),
    setting: indoors,
    look: look({
      words: [{ tier: 0, text: 'Happy 40th, Bram' }],
      decorations: [placed('piped-border', 0)],
    }),
    extras: [{ extraId: 'candles', quantity: 4 }],
    you: person('Lotte de Wit', 'lotte.dewit@example.com', '607 555 0107'),
    consents: agreed,
  },
  boat: {
    day: guestsOf({ headCount: 90, occasionId: 'holiday', portionSizeId: 'party' }),
    cake: tiered(
      coat('swiss', { covering: 'fondant', colour: '#23429a' }),
      round(14, 'chocolate', 'hazelnut'),
      round(12, 'chocolate', 'hazelnut'),
      round(8, 'chocolate', 'hazelnut'),
    ),
    setting: indoors,
    look: look({
      decorations: [
        placed('figure', 2, 4, '#f2b632'),
        placed('sugar-flower', 1, 20),
        placed('wafer-ruffles', 0),
      ],
      note: 'A whole harbour: a boat on top and three people waving from the quay.',
    }),
    extras: [],
    you: person('Quill Harbor Club', 'events@quillharbor.example', '607 555 0119'),
    consents: agreed,
  },
} satisfies Record<string, DemoForm>;
