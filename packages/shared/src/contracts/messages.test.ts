import { describe, expect, it } from 'vitest';
import * as z from 'zod/mini';
import { humanMessage } from './messages.ts';
import { submitOrder } from './orders.ts';

const told = (schema: z.ZodMiniType, input: unknown) =>
  schema.safeParse(input, { error: humanMessage }).error?.issues.map(({ message }) => message);

describe('what a person reads where a schema says nothing', () => {
  it.each<[string, z.ZodMiniType, unknown, string]>([
    ['a missing answer', z.string(), undefined, 'This is still missing.'],
    ['a missing number', z.number(), null, 'This is still missing.'],
    ['the wrong kind', z.number(), 'seven', 'Write this as a number.'],
    ['half a person', z.int(), 1.5, 'Write this as a whole number.'],
    ['too little text', z.string().check(z.minLength(3)), 'ab', 'At least 3 characters, please.'],
    ['an empty text', z.string().check(z.minLength(1)), '', 'This is still missing.'],
    ['too much text', z.string().check(z.maxLength(1)), 'ab', 'At most 1 character, please.'],
    ['too few', z.number().check(z.minimum(2)), 1, 'At least 2.'],
    ['too many', z.number().check(z.maximum(10_000)), 10_001, 'At most 10,000.'],
    ['too many of a list', z.array(z.int()).check(z.maxLength(1)), [1, 2], 'At most 1.'],
    ['an empty list', z.array(z.int()).check(z.minLength(1)), [], 'Choose at least one.'],
    ['nothing offered', z.enum(['a', 'b']), 'c', 'Choose one of those offered.'],
    ['no choice', z.enum(['a', 'b']), '', 'Choose one.'],
    ['no address', z.email(), 'rosa', 'Write the address like name@example.com.'],
    ['a day that is none', z.iso.date(), '2027-02-30', 'Choose a day from the calendar.'],
    ['an unknown field', z.strictObject({}), { x: 1 }, 'We do not know “x”.'],
    ['none of several', z.union([z.int(), z.boolean()]), 'x', 'We could not read this.'],
  ])('%s', (_what, schema, input, sentence) => {
    expect(told(schema, input)).toEqual([sentence]);
  });

  it('leaves a schema’s own words alone', () => {
    expect(told(z.string().check(z.minLength(1, 'Tell us your name.')), '')).toEqual([
      'Tell us your name.',
    ]);
  });

  it('never speaks as a machine, whatever is sent for an order', () => {
    for (const input of [
      undefined,
      null,
      7,
      '',
      [],
      {},
      { day: {} },
      { day: { date: 5 }, you: [] },
    ]) {
      for (const sentence of told(submitOrder, input) ?? []) {
        expect(sentence).toMatch(/^[A-Z“].*[.!?]$/);
        expect(sentence).not.toMatch(/invalid|expected|undefined|null|NaN/i);
      }
    }
  });
});
