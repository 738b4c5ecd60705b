import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { amountsOf, carriedPieces, carriedWeightG } from './amounts.ts';
import { partWeights } from './part-weights.ts';
import { containedAllergens, partsOf } from './parts.ts';
import { resolveDesign } from './resolve-design.ts';
import { arbitraryDesign } from './testing/arbitraries.ts';
import { coat, designWith, roundTier } from './testing/design-fixture.ts';
import { menuFixture as menu } from './testing/menu-fixture.ts';

const weigh = (design: ReturnType<typeof designWith>) => partWeights(resolveDesign(design, menu));
const part = (design: ReturnType<typeof designWith>, kind: string, id: string) =>
  weigh(design).parts.find((it) => it.part === kind && it.id === id);

const half = { sizeId: 'half', layers: 2, spongeId: 'almond', fillingId: 'lemon-curd' };

describe('what an order is made of', () => {
  it('adds batter for what baking and levelling take, and a tenth of frosting for the bowl', () => {
    const one = designWith({ cake: { tiers: [roundTier(8, { layers: 2, heightMm: 100 })] } });
    // pi * 203^2 / 4 = 32,365.5 mm2, 94 mm of sponge at 0.48 g/mL.
    expect(part(one, 'sponge', 'vanilla')?.inCakeG).toBeCloseTo(32_365.47 * 0.094 * 0.48, 0);
    expect(part(one, 'sponge', 'vanilla')?.toMakeG).toBeCloseTo(
      (32_365.47 * 0.094 * 0.48) / 0.92 / 0.9,
      0,
    );
    const swiss = part(one, 'style', 'swiss');
    expect(swiss?.toMakeG).toBeCloseTo((swiss?.inCakeG ?? 0) * 1.1, 6);
  });

  it('counts every cutting cake, in the buttercream of the cake on show', () => {
    const tiers = [roundTier(8)];
    const coating = coat({ covering: 'fondant', finish: 'textured', colour: '#aabbcc' });
    const none = designWith({ cake: { tiers, coating } });
    const two = designWith({
      cake: { tiers, coating, cuttingCakes: [{ ...half, count: 2 }] },
    });
    // 457 x 330 mm, 50 high with one filling of 6 mm: 150,810 mm2 x 44 mm at 0.52 g/mL, twice.
    expect(part(two, 'sponge', 'almond')?.inCakeG).toBeCloseTo(2 * 150.81 * 44 * 0.52, 0);
    // Kitchen cakes are not covered with fondant.
    expect(part(two, 'covering', 'fondant')).toEqual(part(none, 'covering', 'fondant'));
    expect(part(two, 'style', 'swiss')?.toMakeG).toBeGreaterThan(
      part(none, 'style', 'swiss')?.toMakeG ?? 0,
    );
    const piece = weigh(two).pieces.find((it) => it.kind === 'cutting-cake');
    expect(piece).toMatchObject({ index: 0, count: 2 });
    // A soft filling has its dam in these too.
    expect(part(two, 'filling', 'lemon-curd')?.inCakeG).toBeLessThan(2 * 150.81 * 6 * 1.1);
  });

  it('names what only a cutting cake contains among the allergens of the whole', () => {
    const allergens = (cuttingCakes: (typeof half & { count: number })[]) =>
      containedAllergens(
        partsOf(resolveDesign(designWith({ cake: { tiers: [roundTier(8)], cuttingCakes } }), menu)),
      );
    expect(allergens([]).some((it) => it.allergen === 'tree-nuts')).toBe(false);
    expect(allergens([{ ...half, count: 1 }])).toContainEqual({
      allergen: 'tree-nuts',
      species: ['almond'],
      state: 'contains',
      parts: ['Almond and orange sponge'],
    });
  });

  it('takes borders and lettering from the coat of their tier', () => {
    const border = {
      decorationId: 'border',
      tier: null,
      quantity: 1,
      colour: null,
      source: 'studio' as const,
    };
    const at = (look: Parameters<typeof designWith>[0]['look']) =>
      part(designWith({ cake: { tiers: [roundTier(8)] }, look }), 'style', 'swiss')?.inCakeG ?? 0;
    // The fixture's border weighs 20 g on a round of 8 in.
    expect(at({ decorations: [border] }) - at({})).toBeCloseTo(20, 6);
    expect(at({ words: [{ tier: 0, text: 'Ana & Bo' }] }) - at({})).toBeCloseTo(6, 6);
    const parts = weigh(designWith({ look: { decorations: [border] } })).parts;
    expect(parts.some((it) => it.part === 'decoration')).toBe(false);
  });

  it('lists exactly the parts that the allergens are read from, but for what others bring', () => {
    fc.assert(
      fc.property(arbitraryDesign, (design) => {
        const resolved = resolveDesign(design, menu);
        const weighed = new Set(partWeights(resolved).parts.map((it) => `${it.part}:${it.id}`));
        for (const it of partsOf(resolved)) {
          if (it.kind === 'decoration') continue;
          const single = [...resolved.tiers, ...resolved.cuttingCakes].every(
            (body) => body.filling?.id !== it.id || body.layers === 1,
          );
          // A filling of a single layer is chosen but not there.
          if (it.kind === 'filling' && single) continue;
          expect(weighed).toContain(`${it.kind === 'buttercream' ? 'style' : it.kind}:${it.id}`);
        }
      }),
    );
  });

  it('is what the totals say, piece by piece', () => {
    fc.assert(
      fc.property(arbitraryDesign, (design) => {
        const resolved = resolveDesign(design, menu);
        const { pieces, parts } = partWeights(resolved);
        const total = amountsOf(resolved);
        const made = (kind: string) =>
          parts.filter((it) => it.part === kind).reduce((sum, it) => sum + it.toMakeG, 0);
        expect(made('sponge')).toBeCloseTo(total.batterG, 3);
        expect(made('style')).toBeCloseTo(total.frostingG, 3);
        const inPieces = pieces.reduce(
          (sum, it) => sum + it.count * it.parts.reduce((grams, one) => grams + one.inCakeG, 0),
          0,
        );
        const { spongeG, fillingG, frostingOnCakeG, coveringOnCakeG } = total;
        expect(inPieces).toBeCloseTo(spongeG + fillingG + frostingOnCakeG + coveringOnCakeG, 3);
      }),
    );
  });
});

describe('what is carried', () => {
  it('is weighed piece by piece; cutting cakes are carried by themselves', () => {
    const design = designWith({ cake: { cuttingCakes: [{ ...half, count: 2 }] } });
    const resolved = resolveDesign(design, menu);
    const amounts = amountsOf(resolved);
    const pieces = carriedPieces(resolved, amounts);
    expect(pieces.map(({ kind, index, count }) => [kind, index, count])).toEqual([
      ['tier', 0, 1],
      ['tier', 1, 1],
      ['tier', 2, 1],
      ['cutting-cake', 0, 2],
    ]);
    const alone = resolveDesign(designWith({}), menu);
    expect(carriedWeightG(resolved, amounts)).toBe(carriedWeightG(alone, amountsOf(alone)));
  });
});
