import type { OrderForm } from '../draft/empty-order.ts';

/**
 * The answers without what belongs to a choice not taken. The draft keeps both the tiers and the
 * sheet, so that changing one's mind loses nothing; an order has one of them, and words and
 * decorations of tiers that are not there move to what is. Positions in lists stay as they are.
 */
export function tidyOrder(values: OrderForm): OrderForm {
  const sheet = values.cake.kind === 'sheet';
  const last = sheet ? 0 : Math.max(0, values.cake.tiers.length - 1);
  return {
    ...values,
    cake: sheet ? { ...values.cake, tiers: [] } : { ...values.cake, sheet: null },
    look: {
      ...values.look,
      words: values.look.words.map((it) => ({ ...it, tier: Math.min(it.tier, last) })),
      decorations: values.look.decorations.map((it) => ({
        ...it,
        tier: sheet || it.tier === null ? null : Math.min(it.tier, last),
      })),
    },
  };
}

/** What is sent: tidied, without words nobody wrote and without numbers that say nothing. */
export function orderToSend(values: OrderForm, seenTotalMinor: number | null): OrderForm {
  const tidy = tidyOrder(values);
  return {
    ...tidy,
    look: { ...tidy.look, words: tidy.look.words.filter((it) => it.text.trim() !== '') },
    you: tidy.you.otherCollects ? tidy.you : { ...tidy.you, collectorName: '', collectorPhone: '' },
    consents: {
      ...tidy.consents,
      allergyData: tidy.consents.allergyData && tidy.day.allergies.length > 0,
    },
    seenTotalMinor,
  };
}
