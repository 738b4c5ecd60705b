import { describe, expect, it } from 'vitest';
import type { Tier } from '#shared/contracts/design.ts';
import { answered } from '../testing/answered.ts';
import {
  applyPatch,
  changeTier,
  isProposal,
  moveTier,
  removeTier,
  takeProposal,
} from './edit-cake.ts';
import { designOf } from './design-of.ts';
import { orderToSend, tidyOrder } from './tidy-order.ts';

const flower = {
  decorationId: 'sugar-flower',
  quantity: 3,
  colour: null,
  source: 'studio' as const,
};

function decorated() {
  const values = answered();
  values.look.words = [
    { tier: 0, text: 'Happy birthday' },
    { tier: 1, text: 'Jo' },
  ];
  values.look.decorations = [
    { ...flower, tier: 1 },
    { ...flower, tier: null },
  ];
  return values;
}

const small = (tier: Tier): Tier => ({ ...tier, widthMm: 200, depthMm: 200 });

describe('changing the cake', () => {
  it('takes what is on a tier along when it moves', () => {
    const { cake, look } = moveTier(decorated(), 0, 1);
    expect(cake.tiers.map((it) => it.widthMm)).toEqual([150, 250]);
    expect(look.words).toEqual([
      { tier: 1, text: 'Happy birthday' },
      { tier: 0, text: 'Jo' },
    ]);
    expect(look.decorations.map((it) => it.tier)).toEqual([0, null]);
    expect(moveTier({ cake, look }, 1, 1)).toEqual({ cake, look });
  });

  it('takes a tier away with what was on it; those above come down', () => {
    const { cake, look } = removeTier(decorated(), 0);
    expect(cake.tiers.map((it) => it.widthMm)).toEqual([150]);
    expect(look.words).toEqual([{ tier: 0, text: 'Jo' }]);
    expect(look.decorations.map((it) => it.tier)).toEqual([0, null]);
  });

  it('keeps chosen sponges and all words when another proposal is taken', () => {
    const values = decorated();
    const [first] = values.cake.tiers;
    if (first === undefined) throw new Error('no tier');
    const proposed = { tiers: [{ ...small(first), spongeId: 'plain' }], cuttingCakes: [] };
    const { cake, look } = takeProposal(values, proposed);
    expect(cake.tiers[0]).toMatchObject({ widthMm: 200, spongeId: 'vanilla' });
    expect(look.words).toEqual([{ tier: 0, text: 'Happy birthday Jo' }]);
    expect(look.decorations).toHaveLength(2);
    expect(isProposal(cake, proposed)).toBe(true);
    expect(isProposal(values.cake, proposed)).toBe(false);
  });

  it('takes a show cake with its cutting cakes, which have the inside that was chosen', () => {
    const values = answered();
    const cut = { sizeId: 'half', count: 2, layers: 2, spongeId: 'plain', fillingId: 'plain' };
    const proposed = { tiers: values.cake.tiers, cuttingCakes: [cut] };
    const { cake } = takeProposal(values, proposed);
    expect(cake.cuttingCakes).toEqual([{ ...cut, spongeId: 'vanilla', fillingId: 'raspberry' }]);
    expect(isProposal(cake, proposed)).toBe(true);
    expect(isProposal(values.cake, proposed)).toBe(false);
    // A cake by itself has none again.
    expect(takeProposal({ ...values, cake }, { ...proposed, cuttingCakes: [] }).cake).toMatchObject(
      { cuttingCakes: [] },
    );
  });

  it('keeps a tier sound: a dummy has nothing inside, a real one gets it back', () => {
    const [first] = answered().cake.tiers;
    if (first === undefined) throw new Error('no tier');
    const inside = { spongeId: 'vanilla', fillingId: 'raspberry' };
    const dummy = changeTier({ ...first, keepsake: true }, { real: false }, inside);
    expect(dummy).toMatchObject({ spongeId: null, fillingId: null, keepsake: false });
    expect(changeTier(dummy, { real: true }, inside)).toMatchObject(inside);
    expect(changeTier(first, { widthMm: 200 }, inside).depthMm).toBe(200);
  });

  it('applies advice to the parts it names alone', () => {
    const values = decorated();
    const [first] = values.cake.tiers;
    if (first === undefined) throw new Error('no tier');
    const cooler = { ...values.setting, place: 'indoors' as const, minutesOut: 30 };
    expect(applyPatch(values, { setting: cooler })).toEqual({ ...values, setting: cooler });
    const marzipan = {
      ...values.look,
      decorations: [
        { decorationId: 'marzipan', tier: 0, quantity: 1, colour: null, source: 'studio' as const },
      ],
    };
    const plain = applyPatch(
      { ...values, look: marzipan },
      { look: { ...marzipan, decorations: [], words: [] } },
    );
    expect(plain.look).toEqual({ ...values.look, decorations: [] });
    const patched = applyPatch(values, { cake: { ...values.cake, tiers: [small(first)] } });
    expect(patched.cake.tiers).toHaveLength(1);
    expect(patched.look.words).toEqual([{ tier: 0, text: 'Happy birthday Jo' }]);
    expect(patched.setting).toEqual(values.setting);
  });
});

describe('what is sent', () => {
  it('leaves out the choice not taken and moves what stood on it', () => {
    const values = decorated();
    values.cake.kind = 'sheet';
    values.cake.sheet = { sizeId: 'half', layers: 2, spongeId: 'vanilla', fillingId: null };
    values.look.words.push({ tier: 0, text: '   ' });
    const sent = orderToSend(values, 41_250);
    expect(sent.cake.tiers).toEqual([]);
    expect(sent.look.words.map((it) => it.tier)).toEqual([0, 0]);
    expect(sent.look.decorations.every((it) => it.tier === null)).toBe(true);
    expect(sent.seenTotalMinor).toBe(41_250);
    expect(values.cake.tiers).toHaveLength(2);
    expect(tidyOrder(values).look.words).toHaveLength(3);
  });

  it('asks for no allergy consent it does not need, and no collector who is not coming', () => {
    const values = answered();
    values.consents.allergyData = true;
    values.you.collectorName = 'Theo';
    const sent = orderToSend(values, null);
    expect(sent.consents.allergyData).toBe(false);
    expect(sent.you.collectorName).toBe('');
  });
});

describe('the design of a draft', () => {
  it('is there once there is a head count and an occasion, the setting once it was asked', () => {
    const values = answered();
    expect(
      designOf({ ...values, day: { ...values.day, headCount: Number.NaN } }, 'day'),
    ).toBeNull();
    expect(designOf(values, 'cake')?.setting).toBeNull();
    expect(designOf(values, 'setting')?.setting).toEqual(values.setting);
    expect(designOf(values, 'cake')?.guests).not.toHaveProperty('date');
  });

  it('stays while a figure cannot be read', () => {
    const values = answered();
    values.setting.minutesOut = Number.NaN;
    values.setting.warmestC = Number.NaN;
    expect(designOf(values, 'look')?.setting).toMatchObject({ minutesOut: 0, warmestC: null });
  });
});
