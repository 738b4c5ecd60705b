import type { SubmitOrder, SubmittedOrder } from '#shared/contracts/orders.ts';
import { submittedOrder } from '#shared/contracts/orders.ts';
import { idempotencyHeader } from '#shared/contracts/headers.ts';
import { newId } from '#api/platform/ids.ts';
import type { Answer, TestClient } from './test-client.ts';

/** Parts of the wizard's form that a test has an opinion about. */
export type FormChanges = {
  readonly day?: Partial<SubmitOrder['day']>;
  readonly cake?: Partial<SubmitOrder['cake']>;
  readonly setting?: Partial<SubmitOrder['setting']>;
  readonly look?: Partial<SubmitOrder['look']>;
  readonly you?: Partial<SubmitOrder['you']>;
  readonly consents?: Partial<SubmitOrder['consents']>;
} & Partial<Pick<SubmitOrder, 'extras' | 'photos' | 'seenTotalMinor' | 'askWithoutDate'>>;

/** A round tier of the seeded studio, inches as the trade says them. */
export const roundTier = (
  inches: number,
  changes: Partial<SubmitOrder['cake']['tiers'][number]> = {},
): SubmitOrder['cake']['tiers'][number] => ({
  shape: 'round',
  widthMm: Math.round(inches * 25.4),
  depthMm: Math.round(inches * 25.4),
  heightMm: 102,
  layers: 3,
  real: true,
  keepsake: false,
  spongeId: 'vanilla',
  fillingId: 'raspberry',
  coating: null,
  ...changes,
});

/**
 * A whole form for the seeded studio: an 8 in birthday cake for 20, vanilla and raspberry under
 * Swiss meringue, indoors; the date is up to the test.
 */
export function orderForm(date: string, changes: FormChanges = {}): SubmitOrder {
  return {
    day: {
      headCount: 20,
      occasionId: 'birthday',
      otherDesserts: false,
      portionSizeId: 'dessert',
      allergies: [],
      diets: [],
      dietNote: '',
      infants: false,
      susceptible: false,
      date,
      windowStart: 600,
      ...changes.day,
    },
    cake: {
      kind: 'tiered',
      tiers: [roundTier(8)],
      sheet: null,
      coating: { covering: 'buttercream', style: 'swiss', finish: 'smooth', colour: null },
      cuttingCakes: [],
      ...changes.cake,
    },
    setting: {
      place: 'indoors',
      warmestC: 21,
      minutesOut: 60,
      driveMinutes: 15,
      servedAt: null,
      ...changes.setting,
    },
    look: { palette: [], words: [], decorations: [], note: '', ...changes.look },
    extras: changes.extras ?? [],
    photos: changes.photos ?? [],
    you: {
      name: 'Mara Ellery',
      email: 'mara@example.com',
      phone: '607 555 0133',
      reachBy: 'email',
      otherCollects: false,
      collectorName: '',
      collectorPhone: '',
      ...changes.you,
    },
    consents: { policies: true, allergyData: false, showPhotos: false, ...changes.consents },
    seenTotalMinor: changes.seenTotalMinor ?? null,
    askWithoutDate: changes.askWithoutDate ?? false,
  };
}

/** Sends a form under a key of its own, or a given one. */
export function sendOrder(
  client: TestClient,
  form: unknown,
  key: string = newId(),
): Promise<Answer> {
  return client.post('/api/orders', form, { headers: { [idempotencyHeader]: key } });
}

/** Sends a form that must be taken. */
export async function placeOrder(client: TestClient, form: SubmitOrder): Promise<SubmittedOrder> {
  const answer = await sendOrder(client, form);
  if (answer.status !== 201) throw new Error(`the order was refused: ${answer.text}`);
  return submittedOrder.parse(answer.body);
}
