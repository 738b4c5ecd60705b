import type { Coating, Declaration, Design, Setting, Tier } from '#shared/contracts/design.ts';
import { inches } from './menu-fixture.ts';

/** Designs for the menu fixture; every helper takes only what a test is about. */

export const swissCoat: Coating = {
  covering: 'buttercream',
  style: 'swiss',
  finish: 'smooth',
  colour: null,
};

export const coat = (change: Partial<Coating>): Coating => ({ ...swissCoat, ...change });

export function roundTier(across: number, change: Partial<Tier> = {}): Tier {
  return {
    shape: 'round',
    widthMm: inches(across),
    depthMm: inches(across),
    heightMm: inches(4),
    layers: 3,
    real: true,
    keepsake: false,
    spongeId: 'vanilla',
    fillingId: 'raspberry',
    coating: null,
    ...change,
  };
}

export const indoors: Setting = {
  place: 'indoors',
  warmestC: 20,
  minutesOut: 60,
  driveMinutes: 15,
  servedAt: null,
};

export function declares(change: Partial<Declaration>): Declaration {
  return { allergen: 'egg', species: null, text: '', severity: 'allergy', guests: 1, ...change };
}

/** Seventy guests, three round tiers of 10, 8 and 6 in in Swiss meringue, a cool room. */
export const designFixture: Design = {
  guests: {
    headCount: 70,
    occasionId: 'wedding',
    otherDesserts: false,
    portionSizeId: 'dessert',
    allergies: [],
    diets: [],
    dietNote: '',
    infants: false,
    susceptible: false,
  },
  cake: {
    kind: 'tiered',
    tiers: [roundTier(10), roundTier(8), roundTier(6)],
    sheet: null,
    coating: swissCoat,
    cuttingCakes: [],
  },
  setting: indoors,
  look: { palette: [], words: [], decorations: [], note: '' },
  extras: [],
};

type Changes = {
  readonly guests?: Partial<Design['guests']>;
  readonly cake?: Partial<NonNullable<Design['cake']>> | null;
  readonly setting?: Partial<Setting> | null;
  readonly look?: Partial<NonNullable<Design['look']>>;
  readonly extras?: Design['extras'];
};

/** The design above with some of its answers changed. */
export function designWith(changes: Changes): Design {
  const { guests, cake, setting, look, extras } = designFixture;
  return {
    guests: { ...guests, ...changes.guests },
    cake: changes.cake === null || cake === null ? null : { ...cake, ...changes.cake },
    setting:
      changes.setting === null || setting === null ? null : { ...setting, ...changes.setting },
    look: look === null ? null : { ...look, ...changes.look },
    extras: changes.extras ?? extras,
  };
}
