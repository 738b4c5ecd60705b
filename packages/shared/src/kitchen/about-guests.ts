import type { Advice } from '#shared/contracts/estimates.ts';

/** Advice about who will eat: it repeats what guests told, which is health data. */
const ofGuests: readonly Advice['code'][] = [
  'allergen',
  'allergen-unknown',
  'allergy-text',
  'kitchen',
  'egg',
  'infants',
  'honey',
  'alcohol',
  'diet',
];

/**
 * Whether advice is about the guests rather than about the table and the cake: mails, lists and
 * whoever need not know say only that there is some.
 */
export function isAboutGuests({ code }: Pick<Advice, 'code'>): boolean {
  return ofGuests.includes(code);
}
