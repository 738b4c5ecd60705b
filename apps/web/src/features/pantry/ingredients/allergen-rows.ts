import type { AllergenState } from '#shared/contracts/vocabulary.ts';
import { stateWords } from './ingredient-words.ts';

const states: readonly AllergenState[] = ['contains', 'may-contain', 'not-declared', 'unknown'];

/** What a label can say of an allergen, in the order of the table's columns. */
export const allergenStates = states.map((value) => ({
  value,
  label: stateWords[value],
  stop: value === 'unknown',
}));

/** What a label can say of a fact. */
export const factStates = [
  { value: 'yes', label: 'yes' },
  { value: 'no', label: 'no' },
  { value: 'unknown', label: 'unknown' },
] as const;
