import { emptyOrder, type OrderForm } from '../draft/empty-order.ts';

/** A form in which every step is answered: two tiers for forty in Swiss meringue. */
export function answered(): OrderForm {
  const values = emptyOrder();
  const tier = {
    shape: 'round' as const,
    heightMm: 100,
    layers: 3,
    real: true,
    keepsake: false,
    spongeId: 'vanilla',
    fillingId: 'raspberry',
    coating: null,
  };
  return {
    ...values,
    day: {
      ...values.day,
      headCount: 40,
      occasionId: 'wedding',
      date: '2027-06-19',
      windowStart: 600,
    },
    cake: {
      kind: 'tiered',
      tiers: [
        { ...tier, widthMm: 250, depthMm: 250 },
        { ...tier, widthMm: 150, depthMm: 150 },
      ],
      sheet: null,
      coating: { covering: 'buttercream', style: 'swiss', finish: 'smooth', colour: null },
      cuttingCakes: [],
    },
    you: { ...values.you, name: 'Mara Quill', email: 'mara@example.com' },
    consents: { ...values.consents, policies: true },
  };
}
