import type {
  ButtercreamStyle,
  Covering,
  Decoration,
  Filling,
  Sponge,
} from '#shared/contracts/menu.ts';
import { contentsWith, egg, entry, milk, soy, wheat } from './contents-fixture.ts';

/** Sponges, fillings, coats and decorations of the invented studio, for tests. */

const sponge = (it: Pick<Sponge, 'id' | 'name' | 'contents'> & Partial<Sponge>): Sponge => ({
  blurb: 'Baked the day before.',
  colour: '#ead9b0',
  densityGPerMl: 0.48,
  bakeLossPpm: 100_000,
  levellingPpm: 80_000,
  surchargePerPortionMinor: 0,
  ...it,
});

export const sponges: Sponge[] = [
  sponge({
    id: 'vanilla',
    name: 'Vanilla',
    contents: contentsWith([wheat, egg, milk], {
      statement: 'wheat flour, sugar, egg, butter (milk), milk, baking powder, vanilla, salt',
    }),
  }),
  sponge({
    id: 'chocolate',
    name: 'Chocolate',
    colour: '#5a3a2a',
    surchargePerPortionMinor: 25,
    contents: contentsWith([wheat, egg, milk, soy], {
      statement: 'sugar, wheat flour, milk, egg, cocoa, dark chocolate (soy lecithin)',
    }),
  }),
  sponge({
    id: 'almond',
    name: 'Almond and orange',
    surchargePerPortionMinor: 60,
    densityGPerMl: 0.52,
    contents: contentsWith([
      egg,
      entry('tree-nuts', ['almond']),
      entry('tree-nuts', ['hazelnut'], 'may-contain'),
    ]),
  }),
  sponge({
    id: 'cocoa-oil',
    name: 'Dark cocoa',
    colour: '#4a2c22',
    contents: contentsWith([wheat, entry('soy', [], 'may-contain')]),
  }),
  sponge({
    id: 'honey',
    name: 'Honey',
    contents: contentsWith([wheat, egg, milk], { honey: true }),
  }),
  sponge({
    id: 'rice-cocoa',
    name: 'Rice flour and cocoa',
    colour: '#503226',
    surchargePerPortionMinor: 80,
    contents: contentsWith([soy]),
  }),
];

const filling = (it: Pick<Filling, 'id' | 'name' | 'contents'> & Partial<Filling>): Filling => ({
  blurb: 'Made here.',
  colour: '#f0d060',
  densityGPerMl: 1.1,
  thicknessMm: 6,
  soft: false,
  holdsToC: 28,
  surchargePerPortionMinor: 0,
  ...it,
});

export const fillings: Filling[] = [
  filling({
    id: 'raspberry',
    name: 'Raspberry jam',
    colour: '#b03050',
    densityGPerMl: 1.3,
    holdsToC: 32,
    contents: contentsWith([], { statement: 'raspberries, sugar, lemon juice' }),
  }),
  filling({
    id: 'lemon-curd',
    name: 'Lemon curd',
    soft: true,
    holdsToC: 22,
    surchargePerPortionMinor: 30,
    contents: contentsWith([egg, milk]),
  }),
  filling({
    id: 'hazelnut',
    name: 'Hazelnut cream',
    colour: '#9a6a40',
    holdsToC: 26,
    surchargePerPortionMinor: 60,
    contents: contentsWith([
      milk,
      soy,
      entry('tree-nuts', ['hazelnut']),
      entry('peanut', [], 'may-contain'),
    ]),
  }),
  filling({
    id: 'rum-caramel',
    name: 'Rum caramel',
    colour: '#b07030',
    soft: true,
    holdsToC: 24,
    contents: contentsWith([milk], { alcohol: true }),
  }),
  filling({
    id: 'apricot',
    name: 'Apricot',
    colour: '#f0a050',
    soft: true,
    holdsToC: 30,
    contents: contentsWith([entry('sulphites', [], 'unknown')]),
  }),
];

const style = (
  it: Pick<ButtercreamStyle, 'id' | 'name' | 'holdsToC' | 'colour' | 'contents'> &
    Partial<ButtercreamStyle>,
): ButtercreamStyle => ({
  blurb: 'One of six.',
  how: 'Beaten slowly.',
  bestFor: 'Coats and fillings.',
  sweetness: 2,
  smoothness: 4,
  detail: 'fine',
  crusts: false,
  refrigerate: true,
  densityGPerMl: 0.72,
  surchargePerPortionMinor: 0,
  ...it,
});

export const styles: ButtercreamStyle[] = [
  style({
    id: 'american',
    name: 'American',
    holdsToC: 26,
    colour: '#f8ebc4',
    sweetness: 5,
    smoothness: 2,
    crusts: true,
    densityGPerMl: 0.9,
    contents: contentsWith([milk]),
  }),
  style({
    id: 'swiss',
    name: 'Swiss meringue',
    holdsToC: 26,
    colour: '#f8f1dd',
    smoothness: 5,
    surchargePerPortionMinor: 40,
    contents: contentsWith([egg, milk]),
  }),
  style({
    id: 'italian',
    name: 'Italian meringue',
    holdsToC: 28,
    colour: '#fbf6ea',
    smoothness: 5,
    surchargePerPortionMinor: 50,
    contents: contentsWith([egg, milk], { undercookedEgg: true }),
  }),
  style({
    id: 'french',
    name: 'French',
    holdsToC: 22,
    colour: '#fae08a',
    detail: 'soft',
    densityGPerMl: 0.75,
    surchargePerPortionMinor: 50,
    contents: contentsWith([egg, milk], { undercookedEgg: true }),
  }),
  style({
    id: 'german',
    name: 'German',
    holdsToC: 22,
    colour: '#f7e8b8',
    smoothness: 3,
    detail: 'none',
    densityGPerMl: 0.85,
    surchargePerPortionMinor: 45,
    contents: contentsWith([egg, milk]),
  }),
  style({
    id: 'russian',
    name: 'Russian',
    holdsToC: 23,
    colour: '#fdfbf4',
    sweetness: 3,
    smoothness: 4,
    detail: 'soft',
    densityGPerMl: 0.75,
    surchargePerPortionMinor: 20,
    contents: contentsWith([milk]),
  }),
];

const covering = (
  it: Pick<Covering, 'id' | 'name' | 'holdsToC' | 'contents'> & Partial<Covering>,
): Covering => ({
  blurb: 'Over the whole cake.',
  colour: '#ffffff',
  detail: 'fine',
  finishes: ['smooth', 'textured', 'piped'],
  densityGPerMl: 1,
  thicknessMm: 0,
  surchargePerPortionMinor: 0,
  ...it,
});

export const coverings: Covering[] = [
  covering({ id: 'buttercream', name: 'Buttercream', holdsToC: 26, contents: contentsWith([]) }),
  covering({
    id: 'fondant',
    name: 'Fondant',
    holdsToC: 35,
    finishes: ['smooth', 'textured'],
    densityGPerMl: 1.3,
    thicknessMm: 4,
    surchargePerPortionMinor: 120,
    contents: contentsWith([], { gelatine: true, animalOrigin: true }),
  }),
  covering({
    id: 'ganache',
    name: 'Dark chocolate ganache',
    colour: '#3b241a',
    holdsToC: 29,
    detail: 'soft',
    finishes: ['smooth', 'textured'],
    densityGPerMl: 1.15,
    thicknessMm: 5,
    surchargePerPortionMinor: 80,
    contents: contentsWith([milk, soy]),
  }),
  covering({
    id: 'semi-naked',
    name: 'Semi-naked',
    holdsToC: 26,
    detail: 'soft',
    finishes: ['smooth'],
    contents: contentsWith([]),
  }),
];

const decoration = (
  it: Pick<Decoration, 'id' | 'name' | 'glyph'> & Partial<Decoration>,
): Decoration => ({
  blurb: 'Made here.',
  edge: 'edible',
  sources: ['studio'],
  needs: 'none',
  priceMinor: 800,
  per: 'cake',
  minutes: 15,
  madeAhead: false,
  keepsDays: null,
  skill: null,
  noticeDays: 0,
  weightG: 20,
  caution: '',
  smallParts: false,
  contents: contentsWith([]),
  ...it,
});

export const decorations: Decoration[] = [
  decoration({
    id: 'sugar-flower',
    name: 'Sugar flower',
    glyph: 'flower',
    edge: 'remove-before-eating',
    priceMinor: 1500,
    per: 'piece',
    noticeDays: 7,
    caution: 'On wires: lift each flower off before cutting.',
    contents: contentsWith([egg]),
  }),
  decoration({
    id: 'fresh-flowers',
    name: 'Fresh flowers',
    glyph: 'flower',
    edge: 'remove-before-eating',
    sources: ['florist', 'customer'],
    priceMinor: 2400,
    caution: 'Flowers come off before cutting.',
  }),
  decoration({ id: 'border', name: 'Piped border', glyph: 'border', needs: 'soft', per: 'tier' }),
  decoration({
    id: 'fine-lace',
    name: 'Fine lace',
    glyph: 'border',
    needs: 'fine',
    per: 'tier',
    priceMinor: 3600,
    skill: 'fine-piping',
  }),
  decoration({ id: 'pearls', name: 'Sugar pearls', glyph: 'pearl', smallParts: true }),
  decoration({
    id: 'marzipan',
    name: 'Marzipan fruit',
    glyph: 'fruit',
    per: 'piece',
    priceMinor: 250,
    sources: ['studio', 'customer'],
    contents: contentsWith([entry('tree-nuts', ['almond'])], { cochineal: true }),
  }),
  decoration({
    id: 'topper',
    name: 'Card topper',
    glyph: 'topper',
    edge: 'food-contact-only',
    sources: ['studio', 'customer'],
    priceMinor: 950,
    caution: 'Lift the topper off by its stick.',
  }),
];
