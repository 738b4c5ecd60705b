import type { SubmitOrder } from '#shared/contracts/orders.ts';

/** The one form of the wizard; an unanswered number is NaN, everything else null or empty. */
export type OrderForm = SubmitOrder;

/** The form before anything is answered. */
export function emptyOrder(): OrderForm {
  return {
    day: {
      headCount: Number.NaN,
      occasionId: '',
      otherDesserts: false,
      portionSizeId: 'dessert',
      allergies: [],
      diets: [],
      dietNote: '',
      infants: false,
      susceptible: false,
      date: null,
      windowStart: null,
    },
    cake: { kind: 'tiered', tiers: [], sheet: null, coating: null, cuttingCakes: [] },
    setting: { place: 'indoors', warmestC: null, minutesOut: 60, driveMinutes: 20, servedAt: null },
    look: { palette: [], words: [], decorations: [], note: '' },
    extras: [],
    photos: [],
    you: {
      name: '',
      email: '',
      phone: '',
      reachBy: 'email',
      otherCollects: false,
      collectorName: '',
      collectorPhone: '',
    },
    consents: { policies: false, allergyData: false, showPhotos: false },
    seenTotalMinor: null,
    askWithoutDate: false,
  };
}

/** Whether anything but a known name and address is there, so that there is something to keep. */
export function isUntouched(values: OrderForm): boolean {
  const empty = emptyOrder();
  return JSON.stringify({ ...values, you: empty.you }) === JSON.stringify(empty);
}
