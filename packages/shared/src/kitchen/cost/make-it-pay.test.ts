import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Price } from '#shared/contracts/estimates.ts';
import type { DesignCost } from './cost-design.ts';
import { makeItPay, netPriceFor, paysEnough, type PayInput } from './make-it-pay.ts';

const item = { grams: null, minutes: null, count: null };
const cost: DesignCost = {
  currency: 'USD',
  lines: [
    {
      kind: 'ingredients',
      amountMinor: 3000,
      items: [
        { ...item, label: 'Butter', amountMinor: 2400 },
        { ...item, label: 'Sugar', amountMinor: 600 },
      ],
    },
    {
      kind: 'labour',
      amountMinor: 12_000,
      items: [
        { ...item, label: 'Decorating', minutes: 150, amountMinor: 7500 },
        { ...item, label: 'Baking', minutes: 90, amountMinor: 4500 },
      ],
    },
    { kind: 'overhead', amountMinor: 3000, items: [] },
  ],
  totalMinor: 18_000,
  unknown: [],
  netPriceMinor: 20_000,
  marginMinor: 2000,
  marginPpm: 100_000,
  targetMarginPpm: 250_000,
  minutes: 240,
};
const price: Price = {
  currency: 'USD',
  priceBookVersionId: 'b',
  lines: [],
  subtotalMinor: 20_000,
  taxMinor: 1600,
  taxInclusive: false,
  totalMinor: 21_600,
  depositMinor: 0,
};
const input: PayInput = {
  cost,
  price,
  rates: { labourPerHourMinor: 3000, overheadPpm: 200_000 },
  book: {
    taxes: [{ category: 'cake', name: 'Tax', ratePpm: 80_000 }],
    roundToMinor: 50,
    rush: [{ underDays: 8, addPpm: 100_000 }],
  },
  portions: 40,
  sizes: [],
  locale: 'en-US',
};
const lever = (of: PayInput, kind: string) => makeItPay(of).find((it) => it.kind === kind);

describe('what would make it pay', () => {
  it('says nothing where it pays', () => {
    const paying = { ...cost, netPriceMinor: 24_000, marginMinor: 6000, marginPpm: 250_000 };
    expect(paysEnough(paying)).toBe(true);
    expect(makeItPay({ ...input, cost: paying })).toEqual([]);
  });

  it('names the price that leaves the target, with its tax, in the studio’s steps', () => {
    // 18,000 / 0.75 = 24,000 net, 4,000 more; 8 % of that is 320.
    expect(lever(input, 'price')?.sentence).toBe('At $259.50 instead of $216.00 it leaves 25 %.');
  });

  it('names it by the portion', () => {
    expect(lever(input, 'portion')?.sentence).toContain('$1.00 more on each of its 40 portions');
  });

  it('names the minutes, overhead saved along, and where they go', () => {
    // At 20,000 net it may cost 15,000: 3,000 less at 60 a minute (50 and a fifth).
    expect(lever(input, 'minutes')).toMatchObject({
      enough: true,
      sentence: '50 min less of its 4 h of work. Decorating takes the most, 2 h 30.',
    });
  });

  it('names what ingredients would have to cost less, and the dearest', () => {
    expect(lever(input, 'ingredients')).toMatchObject({
      enough: false,
      sentence:
        'It would take $25.00 less of the $30.00 (15 % of the net price) they cost: more than buying better saves. Dearest: Butter $24.00, Sugar $6.00.',
    });
  });

  it('calls it enough only where no more than a quarter of them has to go', () => {
    const dearer = cost.lines.map((it) =>
      it.kind === 'ingredients' ? { ...it, amountMinor: 12_000 } : it,
    );
    expect(lever({ ...input, cost: { ...cost, lines: dearer } }, 'ingredients')).toMatchObject({
      enough: true,
      sentence: expect.stringMatching(/^\$25\.00 less of the \$120\.00/u),
    });
  });

  it('says where a lever alone is not enough', () => {
    const dear = { ...cost, totalMinor: 60_000, marginMinor: -40_000, marginPpm: -2_000_000 };
    expect(lever({ ...input, cost: dear }, 'minutes')?.enough).toBe(false);
    expect(lever({ ...input, cost: dear }, 'ingredients')?.enough).toBe(false);
  });

  it('offers the size that leaves most, only where it leaves more', () => {
    const size = (netPriceMinor: number, totalCostMinor: number) => ({
      label: 'Bottom tier 10 in instead of 9 in',
      netPriceMinor,
      totalCostMinor,
    });
    expect(lever({ ...input, sizes: [size(18_000, 17_500)] }, 'size')).toBeUndefined();
    expect(lever({ ...input, sizes: [size(26_000, 19_000)] }, 'size')).toMatchObject({
      enough: true,
      sentence:
        'Bottom tier 10 in instead of 9 in: $60.00 more in price and $10.00 more in cost. It leaves 26.9 %.',
    });
  });

  it('tells what short notice and a discount do', () => {
    expect(lever(input, 'rush')?.sentence).toContain('about $20.00 more and leave 18.2 %');
    const line = (kind: 'rush' | 'discount', amountMinor: number) => ({
      kind,
      label: '',
      quantity: 1,
      amountMinor,
      taxCategory: null,
    });
    const lines = [line('rush', 1000), line('discount', -5000)];
    expect(lever({ ...input, price: { ...price, lines } }, 'rush')?.sentence).toContain(
      'without it 5.3 %',
    );
    expect(lever({ ...input, price: { ...price, lines } }, 'discount')).toMatchObject({
      enough: true,
    });
  });

  it('asks for no more than is needed: the target is met at that price and not a unit below', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 10_000_000 }),
        fc.integer({ min: 0, max: 990_000 }),
        (totalMinor, targetMarginPpm) => {
          const leaves = (netPriceMinor: number) =>
            BigInt(netPriceMinor - totalMinor) * 1_000_000n >=
            BigInt(netPriceMinor) * BigInt(targetMarginPpm);
          const net = netPriceFor(totalMinor, targetMarginPpm);
          expect(leaves(net)).toBe(true);
          if (net > 0) expect(leaves(net - 1)).toBe(false);
        },
      ),
    );
  });
});
