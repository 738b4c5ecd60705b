import { expect, it } from 'vitest';
import { answerAt, noteOn, withAnswer, withNote } from './table-draft.ts';

const any = { allergen: null, severity: 'allergy' } as const;
const egg = { allergen: 'egg', severity: 'allergy' } as const;

it('keeps one word a cell, and none where it goes by the row for any', () => {
  let rules = withAnswer([], any, 'talk');
  rules = withAnswer(rules, egg, 'refuse');
  rules = withAnswer(rules, egg, 'take');
  expect(rules).toHaveLength(2);
  expect(answerAt({ rules }, 'egg', 'allergy')).toBe('take');
  rules = withAnswer(rules, egg, null);
  expect(answerAt({ rules }, 'egg', 'allergy')).toBeNull();
  expect(answerAt({ rules }, null, 'allergy')).toBe('talk');
});

it('dates an assessment when it is written, and not when only the tick changes', () => {
  const old = {
    allergen: 'egg',
    handled: false,
    assessment: 'Old.',
    assessedOn: '2026-01-05',
  } as const;
  const ticked = withNote([old], { ...old, handled: true }, '2027-05-03');
  expect(noteOn({ kitchen: ticked }, 'egg').assessedOn).toBe('2026-01-05');
  const written = withNote(ticked, { ...old, assessment: 'New.' }, '2027-05-03');
  expect(noteOn({ kitchen: written }, 'egg').assessedOn).toBe('2027-05-03');
  const emptied = withNote(written, { ...old, assessment: ' ' }, '2027-05-03');
  expect(noteOn({ kitchen: emptied }, 'egg').assessedOn).toBeNull();
});
