import { describe, expect, it } from 'vitest';
import type { Design, PlacedDecoration } from '#shared/contracts/design.ts';
import type { Advice } from '#shared/contracts/estimates.ts';
import type { StyleId } from '#shared/contracts/vocabulary.ts';
import { poisonousFlowers } from './advice-look.ts';
import { isDeepColour } from './deep-colour.ts';
import { evaluateDesign } from './evaluate-design.ts';
import { coat, designWith, roundTier } from './testing/design-fixture.ts';
import { inches, menuFixture } from './testing/menu-fixture.ts';
import { countCharacters, wordsFit } from './words-fit.ts';

const advise = (design: Design): Advice[] =>
  evaluateDesign({ design, date: null }, menuFixture, '2027-05-01').advice;
const about = (design: Design, it: string) => advise(design).find((one) => one.about === it);

const placed = (
  decorationId: string,
  change: Partial<PlacedDecoration> = {},
): PlacedDecoration => ({
  decorationId,
  tier: null,
  quantity: 1,
  colour: null,
  source: 'studio',
  ...change,
});

describe('detail', () => {
  const lace = (style: StyleId) =>
    designWith({
      cake: { coating: coat({ style }) },
      look: { decorations: [placed('fine-lace')] },
    });

  // Common practice, no source: Russian is too soft for fine shapes.
  it('too fine for a coat is a stop with those that would hold it', () => {
    const found = about(lace('russian'), 'detail:buttercream-russian');
    expect(found).toMatchObject({
      level: 'stop',
      sentence: 'Russian buttercream is too soft for Fine lace.',
    });
    for (const way of found?.ways ?? []) {
      const then = advise({ ...lace('russian'), ...way.patch });
      expect(then.filter((it) => it.about.startsWith('detail:'))).toEqual([]);
    }
    expect(about(lace('swiss'), 'detail:buttercream-swiss')).toBeUndefined();
  });

  it('looks only at the tier it is on', () => {
    const design = designWith({
      cake: {
        tiers: [roundTier(10), roundTier(8, { coating: coat({ style: 'russian' }) })],
      },
      look: { decorations: [placed('fine-lace', { tier: 0 })] },
    });
    expect(advise(design).filter((it) => it.code === 'detail')).toEqual([]);
  });

  it('tells that a crusting coat is hard to get smooth, and what is smoother', () => {
    const design = designWith({ cake: { coating: coat({ style: 'american' }) } });
    expect(about(design, 'smooth:buttercream-american')).toMatchObject({ level: 'care' });
    const textured = coat({ style: 'american', finish: 'textured' });
    expect(
      about(designWith({ cake: { coating: textured } }), 'smooth:buttercream-american'),
    ).toBeUndefined();
  });

  it('refuses a finish that a covering does not have', () => {
    const design = designWith({
      cake: { coating: coat({ covering: 'fondant', finish: 'piped' }) },
    });
    const found = about(design, 'finish:fondant-swiss');
    expect(found).toMatchObject({ level: 'stop', talk: false });
    expect(found?.ways[0]?.patch.cake?.coating?.finish).toBe('smooth');
  });
});

describe('words', () => {
  const saying = (text: string, tier = 0) =>
    designWith({ cake: { tiers: [roundTier(6)] }, look: { words: [{ tier, text }] } });

  it('fit by the width of their tier', () => {
    expect(wordsFit(inches(6), menuFixture)).toBe(19);
    expect(about(saying('Happy birthday Wendy'), 'words:0')?.sentence).toBe(
      '“Happy birthday Wendy” makes 20 characters; that tier has room for 19.',
    );
    expect(about(saying('Happy birthday Bea'), 'words:0')).toBeUndefined();
    const lines = ['Happy birthday', 'Wendy'].map((text) => ({ tier: 0, text }));
    const twoLines = designWith({ cake: { tiers: [roundTier(6)] }, look: { words: lines } });
    expect(about(twoLines, 'words:1')).toBeUndefined();
    const three = designWith({
      cake: { tiers: [roundTier(6)] },
      look: { words: [...lines, { tier: 0, text: '!' }] },
    });
    expect(about(three, 'words:2')?.sentence).toContain('20 characters');
  });

  it('are counted as people count them', () => {
    expect(countCharacters('Zoë')).toBe(3);
    expect(countCharacters('👩‍🍳🎂')).toBe(2);
    expect(countCharacters('e\u0301')).toBe(1);
  });

  it('on a tier that has gone are told of', () => {
    expect(about(saying('Nell', 3), 'words:0')?.level).toBe('stop');
  });
});

describe('what is not cake', () => {
  it('comes off before eating, with its own caution', () => {
    const design = designWith({
      look: { decorations: [placed('sugar-flower'), placed('topper')] },
    });
    expect(about(design, 'inedible')).toMatchObject({
      level: 'care',
      sentence: 'Take off before eating: Sugar flower.',
    });
    expect(about(design, 'inedible')?.instead).toContain('On wires');
    expect(about(design, 'touches-only')?.sentence).toContain('Card topper');
  });

  it('warns of small parts, more so with small children', () => {
    const pearls = { decorations: [placed('pearls')] };
    expect(about(designWith({ look: pearls }), 'small-parts')?.level).toBe('ok');
    const young = designWith({ look: pearls, guests: { infants: true } });
    expect(about(young, 'small-parts')?.level).toBe('care');
  });

  it('asks florists for flowers that belong on food', () => {
    const design = designWith({
      look: { decorations: [placed('fresh-flowers', { source: 'florist' })] },
    });
    for (const flower of poisonousFlowers) {
      expect(about(design, 'flowers')?.sentence).toContain(flower);
    }
  });

  it('names boards and dowels of a stack', () => {
    expect(about(designWith({}), 'supports')?.sentence).toBe(
      'Hidden inside: 2 boards and 9 dowels. Take them out before eating.',
    );
    expect(about(designWith({ cake: { tiers: [roundTier(8)] } }), 'supports')).toBeUndefined();
  });
});

describe('colours', () => {
  it.each([
    ['#c8102e', true],
    ['#14203d', true],
    ['#000000', true],
    ['#f5d3cf', false],
    ['#f2b632', false],
    ['#ffffff', false],
  ])('%s is deep: %s', (hex, deep) => {
    expect(isDeepColour(hex)).toBe(deep);
    const design = designWith({ look: { palette: [hex] } });
    expect(about(design, 'deep-colour') !== undefined).toBe(deep);
  });
});

describe('eating', () => {
  // FDA Food Code 2022, 3-603.11 and 3-801.11.
  it('egg that is not cooked through is said, and stopped for those it could harm', () => {
    const italian = { coating: coat({ style: 'italian' }) };
    expect(about(designWith({ cake: italian }), 'egg')?.level).toBe('care');
    const design = designWith({ cake: italian, guests: { susceptible: true } });
    const found = about(design, 'egg');
    expect(found).toMatchObject({ level: 'stop', talk: true });
    expect(found?.ways.length).toBeGreaterThan(0);
    for (const way of found?.ways ?? []) {
      expect(about({ ...design, ...way.patch }, 'egg')).toBeUndefined();
    }
  });

  it('honey is not for infants', () => {
    const honey = { tiers: [roundTier(8, { spongeId: 'honey' })] };
    expect(about(designWith({ cake: honey }), 'honey')?.level).toBe('ok');
    const design = designWith({ cake: honey, guests: { infants: true } });
    expect(about(design, 'honey')?.level).toBe('stop');
    expect(about(design, 'infants')?.level).toBe('care');
  });

  it('alcohol is said', () => {
    const rum = { tiers: [roundTier(8, { fillingId: 'rum-caramel' })] };
    expect(about(designWith({ cake: rum }), 'alcohol')?.sentence).toBe(
      'Alcohol is in Rum caramel filling.',
    );
  });
});

describe('the cake itself', () => {
  it('says when it feeds too few, with cakes that would do', () => {
    const design = designWith({ guests: { headCount: 120 } });
    const found = about(design, 'portions');
    expect(found?.sentence).toBe('This feeds 77 of the 120 you want to feed.');
    for (const way of found?.ways ?? []) {
      expect(about({ ...design, ...way.patch }, 'portions')).toBeUndefined();
    }
  });

  it('says when much is left over', () => {
    expect(about(designWith({ guests: { headCount: 20 } }), 'portions')?.level).toBe('ok');
  });

  it('offers to keep the cake and to cut more in the kitchen', () => {
    const design = designWith({ guests: { headCount: 120 } });
    const [first] = about(design, 'portions')?.ways ?? [];
    expect(first?.label).toBe('This cake, with two cutting cakes in the kitchen');
    expect(first?.patch.cake?.tiers).toEqual(design.cake?.tiers);
    // 120 less 77 is 43; a quarter sheet cut 50 by 50 mm feeds 24.
    expect(first?.patch.cake?.cuttingCakes).toMatchObject([{ sizeId: 'quarter', count: 2 }]);
  });

  it('says when nothing the studio bakes is large enough', () => {
    const design = designWith({ cake: null, guests: { headCount: 2000 } });
    expect(about(design, 'portions')).toBeUndefined();
    const { advice } = evaluateDesign(
      { design, date: null },
      { ...menuFixture, sheetSizes: [] },
      '2027-05-01',
    );
    expect(advice.find((it) => it.about === 'portions')?.sentence).toBe(
      'Nothing we bake feeds 2000.',
    );
  });

  it('keeps to the tins there are and to tiers that stand', () => {
    const odd = designWith({ cake: { tiers: [roundTier(10, { widthMm: 270, depthMm: 270 })] } });
    const found = about(odd, 'size:0');
    expect(found).toMatchObject({ code: 'too-big', level: 'stop' });
    expect(about({ ...odd, ...found?.ways[0]?.patch }, 'size:0')).toBeUndefined();
    const upsideDown = designWith({ cake: { tiers: [roundTier(6), roundTier(8)] } });
    expect(about(upsideDown, 'step:0')?.level).toBe('stop');
    const narrow = designWith({ cake: { tiers: [roundTier(7), roundTier(6)] } });
    expect(about(narrow, 'step:0')?.level).toBe('care');
  });
});

describe('glitter', () => {
  // US FDA, "Avoid Potentially Unsafe Non-Edible Products Used to Decorate Foods".
  it('is for eating only where it says so', () => {
    const wished = designWith({ look: { note: 'Gold luster dust on the roses, please' } });
    expect(about(wished, 'glitter')?.sentence).toContain('“non-toxic” is not for eating');
    expect(about(designWith({}), 'glitter')).toBeUndefined();
  });
});

describe('raw egg', () => {
  const french = (guests: { susceptible: boolean }) =>
    about(designWith({ guests, cake: { coating: coat({ style: 'french' }) } }), 'egg');

  // FDA Food Code 2022, 3-603.11 (consumer advisory) and 3-801.11 (highly susceptible people).
  it('comes with the advisory, and is not for those who fall ill more easily', () => {
    expect(french({ susceptible: false })).toMatchObject({ level: 'care' });
    expect(french({ susceptible: false })?.sentence).toContain('may raise the risk of illness');
    expect(french({ susceptible: false })?.plain).toContain('3-603.11');
    expect(french({ susceptible: true })).toMatchObject({ level: 'stop', talk: true });
    expect(french({ susceptible: true })?.plain).toContain('160 °F / 71 °C');
  });
});
