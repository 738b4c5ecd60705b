import * as z from 'zod/mini';
import { id, localDate, prose } from './common.ts';
import { allergenEntry, allergyAnswer } from './menu.ts';
import { allergenId, severity } from './vocabulary.ts';

/** One cell of the owner's table; `allergen: null` is the row for all that have no word of their own. */
export const allergyCell = z.object({
  allergen: z.nullable(allergenId),
  severity,
  answer: allergyAnswer,
});

/** What the owner says of one allergen in the kitchen, beside what the labels show. */
export const kitchenNote = z.object({
  allergen: allergenId,
  /** Handled here although no label of what is bought names it. */
  handled: z.boolean(),
  /** The risk assessment that "may contain" rests on (FSA guidance, 2023); empty for none. */
  assessment: prose(2000),
  assessedOn: z.nullable(localDate),
});
export type KitchenNote = z.infer<typeof kitchenNote>;

const cells = z.array(allergyCell).check(
  z.maxLength(80),
  z.refine(
    (it) => new Set(it.map((cell) => `${cell.allergen ?? ''} ${cell.severity}`)).size === it.length,
    'Each allergen and severity has one answer.',
  ),
);

const notes = z.array(kitchenNote).check(
  z.maxLength(20),
  z.refine(
    (it) => new Set(it.map((note) => note.allergen)).size === it.length,
    'Each allergen is noted once.',
  ),
);

/** `GET /api/staff/allergy-table`: the owner's words about allergies, and what labels add to them. */
export const allergyTable = z.object({
  /** Changes with every save; a save names the one it began from. */
  version: id,
  rules: cells,
  kitchen: notes,
  /** Handled by what is bought, worked out from the labels of active ingredients. */
  fromLabels: z.array(allergenEntry),
  kitchenNotice: z.string(),
  homeKitchenText: z.string(),
  eggAdvisory: z.string(),
});
export type AllergyTable = z.infer<typeof allergyTable>;

/** `PUT /api/staff/allergy-table` */
export const saveAllergyTable = z.object({
  version: id,
  rules: cells,
  kitchen: notes,
  kitchenNotice: prose(2000).check(
    z.minLength(1, 'Say what customers should know of your kitchen.'),
  ),
  homeKitchenText: prose(1000),
  eggAdvisory: prose(1000).check(z.minLength(1, 'Say what your local code asks for raw egg.')),
});
export type SaveAllergyTable = z.infer<typeof saveAllergyTable>;
