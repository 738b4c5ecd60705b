import { describe, expect, it } from 'vitest';
import { draftKeptDays, readDraft, restoreValues, writeDraft } from './draft-record.ts';
import { answered } from '../testing/answered.ts';
import { emptyOrder } from './empty-order.ts';

const savedAt = Date.parse('2027-05-03T10:42:00Z');

function record(values = emptyOrder()) {
  return {
    version: 1 as const,
    savedAt,
    writer: 'page-a',
    reached: 'cake' as const,
    values,
    pictures: {},
    attempt: null,
  };
}

describe('a kept draft', () => {
  it('comes back as it was, unread numbers included', () => {
    const values = emptyOrder();
    values.day.occasionId = 'wedding';
    values.day.date = '2027-06-19';
    values.setting.minutesOut = Number.NaN;
    values.look.words = [{ tier: 0, text: 'عيد ميلاد سعيد 🎂' }];
    const back = readDraft(writeDraft(record(values)), savedAt);
    expect(back?.values).toEqual(values);
    expect(back?.reached).toBe('cake');
  });

  it('keeps a half-finished answer: it is not for the shelf to judge', () => {
    const values = emptyOrder();
    values.you.email = 'mara@';
    values.day.headCount = 70.5;
    expect(restoreValues(JSON.parse(JSON.stringify(values)))).toEqual(values);
  });

  it('loses only the part that has another shape', () => {
    const values = { ...emptyOrder(), setting: 'in the garden' };
    values.day.occasionId = 'wedding';
    const back = restoreValues(values);
    expect(back.setting).toEqual(emptyOrder().setting);
    expect(back.day.occasionId).toBe('wedding');
  });

  it('of before there were cutting cakes has none', () => {
    const { cuttingCakes, ...cake } = answered().cake;
    const back = restoreValues({ ...answered(), cake });
    expect(back.cake).toEqual({ ...cake, cuttingCakes });
    expect(back.cake.tiers).toHaveLength(2);
  });

  it('ignores other versions, broken text and drafts that are too old', () => {
    const text = writeDraft(record());
    expect(readDraft(text.replace('"version":1', '"version":0'), savedAt)).toBeNull();
    expect(readDraft('{"version":', savedAt)).toBeNull();
    expect(readDraft(null, savedAt)).toBeNull();
    expect(readDraft(text, savedAt + (draftKeptDays + 1) * 86_400_000)).toBeNull();
  });

  it('survives anything that is not a form at all', () => {
    for (const odd of [null, 7, 'text', [], { day: null, cake: [] }]) {
      expect(restoreValues(odd)).toEqual(emptyOrder());
    }
  });
});
