import type { Coating, Tier } from '#shared/contracts/design.ts';
import type { SubmitOrder } from '#shared/contracts/orders.ts';

/** A form without its day, which is chosen from those that are open. */
export type DemoForm = Omit<SubmitOrder, 'photos' | 'seenTotalMinor' | 'askWithoutDate' | 'day'> & {
  readonly day: Omit<SubmitOrder['day'], 'date' | 'windowStart'>;
};

export type Guests = Partial<DemoForm['day']> & Pick<DemoForm['day'], 'headCount' | 'occasionId'>;

/** A coat of buttercream, smooth unless said. */
export const coat = (style: Coating['style'], changes: Partial<Coating> = {}): Coating => ({
  covering: 'buttercream',
  style,
  finish: 'smooth',
  colour: null,
  ...changes,
});

/** A real round tier of three layers, inches as the trade says them. */
export const round = (
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

/** Guests with nothing to mind unless said. */
export const guestsOf = (guests: Guests): DemoForm['day'] => ({
  otherDesserts: false,
  portionSizeId: 'dessert',
  allergies: [],
  diets: [],
  dietNote: '',
  infants: false,
  susceptible: false,
  ...guests,
});

/** A tiered cake from the board up, under one coat. */
export const tiered = (coating: Coating, ...tiers: Tier[]): SubmitOrder['cake'] => ({
  kind: 'tiered',
  tiers,
  sheet: null,
  coating,
  cuttingCakes: [],
});

/** A decoration on a tier. */
export const placed = (
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

/** A look with nothing on it unless said. */
export const look = (changes: Partial<SubmitOrder['look']>): SubmitOrder['look'] => ({
  palette: [],
  words: [],
  decorations: [],
  note: '',
  ...changes,
});

/** Somebody who orders, collects and is reached by e-mail. */
export const person = (name: string, email: string, phone = ''): SubmitOrder['you'] => ({
  name,
  email,
  phone,
  reachBy: 'email',
  otherCollects: false,
  collectorName: '',
  collectorPhone: '',
});

/** A room as most people have it. */
export const indoors: SubmitOrder['setting'] = {
  place: 'indoors',
  warmestC: 21,
  minutesOut: 60,
  driveMinutes: 15,
  servedAt: null,
};
/** What everybody agrees to, and nothing more. */
export const agreed: SubmitOrder['consents'] = {
  policies: true,
  allergyData: false,
  showPhotos: false,
};
