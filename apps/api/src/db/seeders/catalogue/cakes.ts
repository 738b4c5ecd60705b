import type { CoveringId, Detail, FinishId } from '#shared/contracts/vocabulary.ts';
import type { SeedFilling, SeedSponge, SeedStyle } from './catalogue-types.ts';

/** Sponges and fillings as customers read them; contents come from the formulas. */
export const sponges: readonly SeedSponge[] = [
  {
    id: 'vanilla',
    name: 'Vanilla',
    blurb: 'Butter sponge with real vanilla; goes with everything.',
    formula: 'vanilla-sponge',
    levellingPpm: 80_000,
  },
  {
    id: 'lemon',
    name: 'Lemon',
    blurb: 'Bright, with the zest rubbed into the sugar.',
    formula: 'lemon-sponge',
    levellingPpm: 80_000,
  },
  {
    id: 'honey',
    name: 'Honey',
    blurb: 'Wildflower honey, baked slow and golden.',
    formula: 'honey-sponge',
    levellingPpm: 80_000,
  },
  {
    id: 'chocolate',
    name: 'Chocolate',
    blurb: 'Dark and moist, with bloomed cocoa.',
    formula: 'chocolate-sponge',
    levellingPpm: 80_000,
  },
  {
    id: 'carrot',
    name: 'Carrot and walnut',
    blurb: 'Warm spice and toasted walnuts.',
    formula: 'carrot-sponge',
    levellingPpm: 60_000,
  },
  {
    id: 'almond',
    name: 'Almond and orange',
    blurb: 'Made with ground almonds and a little starch. Wheat is handled in our kitchen.',
    formula: 'almond-sponge',
    levellingPpm: 60_000,
  },
  {
    id: 'orange-chiffon',
    name: 'Orange chiffon',
    blurb: 'Made with oil and orange juice. Milk is handled in our kitchen.',
    formula: 'orange-chiffon',
    levellingPpm: 60_000,
  },
  {
    id: 'cocoa',
    name: 'Dark cocoa',
    blurb: 'Made with cocoa, oil and a little vinegar. Egg and milk are handled in our kitchen.',
    formula: 'cocoa-sponge',
    levellingPpm: 60_000,
  },
];

export const fillings: readonly SeedFilling[] = [
  {
    id: 'raspberry',
    name: 'Raspberry jam',
    blurb: 'Sharp, seeds and all.',
    formula: 'raspberry-jam',
    thicknessMm: 4,
    soft: true,
  },
  {
    id: 'strawberry',
    name: 'Strawberry compote',
    blurb: 'Soft pieces of fruit, lightly set.',
    formula: 'strawberry-compote',
    thicknessMm: 6,
    soft: true,
  },
  {
    id: 'lemon-curd',
    name: 'Lemon curd',
    blurb: 'Buttery and sharp.',
    formula: 'lemon-curd',
    thicknessMm: 5,
    soft: true,
  },
  {
    id: 'passion-fruit',
    name: 'Passion fruit jelly',
    blurb: 'Tart and set; holds well.',
    formula: 'passion-fruit-jelly',
    thicknessMm: 5,
    soft: false,
  },
  {
    id: 'vanilla-cream',
    name: 'Vanilla custard cream',
    blurb: 'Cooked custard with vanilla; likes the cold.',
    formula: 'vanilla-cream',
    thicknessMm: 6,
    soft: true,
  },
  {
    id: 'salted-caramel',
    name: 'Salted caramel',
    blurb: 'Deep amber, with sea salt.',
    formula: 'salted-caramel',
    thicknessMm: 4,
    soft: true,
  },
  {
    id: 'chocolate-cream',
    name: 'Dark chocolate cream',
    blurb: 'Whipped dark chocolate and cream.',
    formula: 'chocolate-cream',
    thicknessMm: 6,
    soft: false,
  },
  {
    id: 'hazelnut',
    name: 'Hazelnut praline cream',
    blurb: 'Roasted hazelnuts and dark chocolate.',
    formula: 'hazelnut-cream',
    thicknessMm: 6,
    soft: false,
  },
  {
    id: 'pistachio',
    name: 'Pistachio cream',
    blurb: 'Nothing but pistachio gives the green.',
    formula: 'pistachio-cream',
    thicknessMm: 6,
    soft: false,
  },
  {
    id: 'cream-cheese',
    name: 'Cream cheese',
    blurb: 'Tangy, and the right one for carrot.',
    formula: 'cream-cheese-filling',
    thicknessMm: 6,
    soft: true,
  },
];

/** The six buttercreams side by side; sweetness and what each does best as bakers judge them. */
export const styles: readonly SeedStyle[] = [
  {
    id: 'american',
    name: 'American',
    blurb: 'Sweet and thick; sets a thin crust.',
    how: 'Butter beaten with powdered sugar, a little cream and vanilla.',
    bestFor: 'Borders and bold piping; hard to get perfectly smooth.',
    formula: 'american-buttercream',
    sweetness: 5,
    smoothness: 2,
    detail: 'soft',
    crusts: true,
  },
  {
    id: 'swiss',
    name: 'Swiss meringue',
    blurb: 'Satin smooth, ivory, gently sweet.',
    how: 'Egg whites and sugar warmed together, whipped to a meringue, then butter.',
    bestFor: 'Smooth coats with clean edges.',
    formula: 'swiss-buttercream',
    sweetness: 2,
    smoothness: 5,
    detail: 'fine',
    crusts: false,
  },
  {
    id: 'italian',
    name: 'Italian meringue',
    blurb: 'Silky, pipes crisply, steadiest in warmth.',
    how: 'Hot sugar syrup poured into whipped whites, then butter.',
    bestFor: 'Smooth coats, crisp piping, warm rooms.',
    formula: 'italian-buttercream',
    sweetness: 2,
    smoothness: 5,
    detail: 'fine',
    crusts: false,
  },
  {
    id: 'french',
    name: 'French',
    blurb: 'Richest of all, bright yellow from yolks.',
    how: 'Hot sugar syrup poured into whipped yolks, then butter.',
    bestFor: 'Rich fillings and piping on cool days.',
    formula: 'french-buttercream',
    sweetness: 2,
    smoothness: 3,
    detail: 'soft',
    crusts: false,
  },
  {
    id: 'german',
    name: 'German',
    blurb: 'Custard in buttercream; a lovely filling.',
    how: 'A cooked custard, cooled, beaten into butter.',
    bestFor: 'Filling between layers; not for warm days.',
    formula: 'german-buttercream',
    sweetness: 2,
    smoothness: 3,
    detail: 'none',
    crusts: false,
  },
  {
    id: 'russian',
    name: 'Russian',
    blurb: 'Light and milky; soft edges only.',
    how: 'Butter whipped white, then sweetened condensed milk and vanilla.',
    bestFor: 'Soft swirls and gentle piping; no fine detail.',
    formula: 'russian-buttercream',
    sweetness: 3,
    smoothness: 4,
    detail: 'soft',
    crusts: false,
  },
];

/** What can go over a cake. A crumb coat of 2 mm and a final coat of 4 mm; fondant 4 mm over a 3 mm coat. */
export const coverings: readonly {
  readonly id: CoveringId;
  readonly name: string;
  readonly blurb: string;
  readonly formula: string | null;
  readonly colour: string;
  readonly crumbCoatMm: number;
  readonly finalCoatMm: number;
  /** Only where the formula does not decide it. */
  readonly holdsToC: number | null;
  readonly detail: Detail;
  readonly finishes: readonly FinishId[];
}[] = [
  {
    id: 'buttercream',
    name: 'Buttercream',
    blurb: 'One of the six, all the way round.',
    formula: null,
    colour: '#f6eeda',
    crumbCoatMm: 2,
    finalCoatMm: 4,
    holdsToC: null,
    detail: 'fine',
    finishes: ['smooth', 'textured', 'piped'],
  },
  {
    id: 'fondant',
    name: 'Fondant',
    blurb: 'A smooth white sheet of sugar paste over a coat of buttercream.',
    formula: 'rolled-fondant',
    colour: '#ffffff',
    crumbCoatMm: 3,
    finalCoatMm: 4,
    holdsToC: 35,
    detail: 'fine',
    finishes: ['smooth', 'textured'],
  },
  {
    id: 'ganache',
    name: 'Chocolate ganache',
    blurb: 'Dark chocolate and cream, set firm with sharp edges.',
    formula: 'dark-ganache',
    colour: '#4a2c1f',
    crumbCoatMm: 2,
    finalCoatMm: 4,
    holdsToC: 29,
    detail: 'soft',
    finishes: ['smooth', 'textured'],
  },
  {
    id: 'semi-naked',
    name: 'Semi-naked',
    blurb: 'A thin scraped coat that lets the sponge show.',
    formula: null,
    colour: '#efe0bd',
    crumbCoatMm: 2,
    finalCoatMm: 0,
    holdsToC: null,
    detail: 'soft',
    finishes: ['smooth'],
  },
];

export const finishes: readonly {
  readonly id: FinishId;
  readonly name: string;
  readonly blurb: string;
}[] = [
  { id: 'smooth', name: 'Smooth', blurb: 'Scraped clean, sharp at the edge.' },
  { id: 'textured', name: 'Textured', blurb: 'Combed, rustic or palette-knife strokes.' },
  { id: 'piped', name: 'Piped all over', blurb: 'Ruffles, rosettes or basket weave, by hand.' },
];
