import { expect, it } from 'vitest';
import { usualKitchen } from '#shared/contracts/kitchen-rules.ts';
import { readFigure, writeFigure } from './figure-kinds.ts';
import { ruleGroups } from './rule-groups.ts';

const fields = ruleGroups.flatMap((it) => it.fields);

it('shows every figure of the kitchen, each once', () => {
  expect(fields.map((it) => it.name).toSorted()).toEqual(Object.keys(usualKitchen).toSorted());
});

it('reads every usual figure back as it was written, in either system', () => {
  for (const leads of [
    { lengthLead: 'in', temperatureLead: 'F' },
    { lengthLead: 'cm', temperatureLead: 'C' },
  ] as const) {
    for (const { name, kind } of fields) {
      const usual = usualKitchen[name];
      const read = readFigure(kind, writeFigure(kind, usual, leads), leads);
      // Whole degrees Fahrenheit and hundredths of a percent are as fine as anybody writes them.
      const fine = kind === 'warmth' ? 0.3 : kind === 'share' ? 50 : 1e-9;
      expect(Math.abs((read ?? Number.NaN) - usual), name).toBeLessThanOrEqual(fine);
    }
  }
});

it('reads the height above the sea in feet and in meters', () => {
  const us = { lengthLead: 'in', temperatureLead: 'F' } as const;
  // Denver's mile: 5,280 ft are 1,609 m (1 ft = 0.3048 m exactly).
  for (const text of ['5280', '5,280 ft', '5280 feet', '5280′', '1609 m', '1,609 metres']) {
    expect(readFigure('altitude', text, us), text).toBe(1609);
  }
  expect(readFigure('altitude', 'high up', us)).toBeNull();
});
