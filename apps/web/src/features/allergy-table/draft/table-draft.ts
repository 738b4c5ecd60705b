import type {
  AllergyTable,
  KitchenNote,
  SaveAllergyTable,
} from '#shared/contracts/allergy-table.ts';
import type { AllergyAnswer } from '#shared/contracts/menu.ts';
import type { AllergenId, Severity } from '#shared/contracts/vocabulary.ts';

/** What stands in the form: the words as they would be saved. */
export type TableDraft = Omit<SaveAllergyTable, 'version'>;

export function draftOf(table: AllergyTable): TableDraft {
  const { rules, kitchen, kitchenNotice, homeKitchenText, eggAdvisory } = table;
  return { rules, kitchen, kitchenNotice, homeKitchenText, eggAdvisory };
}

/** The owner's own word for a cell; null where it goes by the row for any allergen. */
export function answerAt(
  { rules }: Pick<TableDraft, 'rules'>,
  allergen: AllergenId | null,
  severity: Severity,
): AllergyAnswer | null {
  return rules.find((it) => it.allergen === allergen && it.severity === severity)?.answer ?? null;
}

/** The table with another word in one cell; null takes the word away. */
export function withAnswer(
  rules: TableDraft['rules'],
  cell: { readonly allergen: AllergenId | null; readonly severity: Severity },
  answer: AllergyAnswer | null,
): TableDraft['rules'] {
  const others = rules.filter(
    (it) => it.allergen !== cell.allergen || it.severity !== cell.severity,
  );
  return answer === null ? others : [...others, { ...cell, answer }];
}

/** What the owner says of one allergen in the kitchen, or an empty note. */
export function noteOn(
  { kitchen }: Pick<TableDraft, 'kitchen'>,
  allergen: AllergenId,
): KitchenNote {
  return (
    kitchen.find((it) => it.allergen === allergen) ?? {
      allergen,
      handled: false,
      assessment: '',
      assessedOn: null,
    }
  );
}

/** The notes with one changed; an assessment written now is dated today. */
export function withNote(
  kitchen: TableDraft['kitchen'],
  note: KitchenNote,
  today: string,
): TableDraft['kitchen'] {
  const before = kitchen.find((it) => it.allergen === note.allergen);
  const rewritten = note.assessment !== (before?.assessment ?? '');
  const assessedOn =
    note.assessment.trim() === '' ? null : rewritten ? today : (note.assessedOn ?? today);
  return [...kitchen.filter((it) => it.allergen !== note.allergen), { ...note, assessedOn }];
}
