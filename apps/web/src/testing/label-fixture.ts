import type { LabelText } from '#shared/contracts/cards.ts';

/** The label of an invented wedding cake, with something nobody knows. */
export const labelFixture: LabelText = {
  id: 'cake',
  copies: 1,
  region: 'US',
  studio: { name: 'Oxbow Lane Cake Studio', address: '14 Oxbow Lane, Alder Falls, NY 13999' },
  product: 'Cake: vanilla sponge, raspberry jam filling, Swiss meringue buttercream',
  about: 'Wedding, No. 2421',
  ingredients: [{ text: 'Sugar, wheat flour, butter (cream), eggs.', emphasised: false }],
  contains: 'Contains: Milk, Egg, Wheat.',
  signpost: null,
  notKnown: ['Not known: whether gold sugar contains soy.'],
  mayContain: null,
  makersWarn: null,
  kitchen: null,
  net: { grams: 7080, text: 'Net Wt 15 lb 9 oz (7.08 kg)', weighed: false },
  madeOn: '2027-06-18',
  useBy: '2027-06-21',
  keep: ['Keep refrigerated, at 41 °F / 5 °C or colder.'],
  remove: ['Hidden inside: 2 boards and 9 dowels. Take them out as you cut; count them.'],
  cautions: [],
  homeKitchen: '',
  smallestXHeightMm: 1.5875,
  smallestFigureMm: 6.35,
};
