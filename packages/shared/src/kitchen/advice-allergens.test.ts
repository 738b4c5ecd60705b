import { describe, expect, it } from 'vitest';
import type { Design } from '#shared/contracts/design.ts';
import type { Advice } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { evaluateDesign } from './evaluate-design.ts';
import { entry } from './testing/contents-fixture.ts';
import { coat, declares, designWith, roundTier } from './testing/design-fixture.ts';
import { menuFixture } from './testing/menu-fixture.ts';

const today = '2027-05-01';
const advise = (design: Design, menu: Menu = menuFixture): Advice[] =>
  evaluateDesign({ design, date: '2027-06-19' }, menu, today).advice;
const about = (advice: readonly Advice[], it: string) => advice.find((one) => one.about === it);

/** Applies a way as the wizard does and says what is advised then. */
const after = (design: Design, way: Advice['ways'][number] | undefined): Advice[] =>
  advise({ ...design, ...way?.patch });

describe('an allergen in the cake', () => {
  const design = designWith({ guests: { allergies: [declares({ allergen: 'egg' })] } });

  it('is a stop that names every part of the whole cake', () => {
    const found = about(advise(design), 'allergen:egg');
    expect(found).toMatchObject({ level: 'stop', code: 'allergen', step: 'cake', talk: true });
    expect(found?.sentence).toBe(
      'Egg is in Vanilla sponge and Swiss meringue buttercream; one guest is allergic to it.',
    );
  });

  it('comes with whole cakes that would not have it, in one press each', () => {
    const ways = about(advise(design), 'allergen:egg')?.ways ?? [];
    expect(ways.length).toBeGreaterThan(0);
    for (const way of ways) {
      expect(about(after(design, way), 'allergen:egg')).toBeUndefined();
    }
    expect(ways[0]?.label).toBe('Dark cocoa sponge and American buttercream');
  });

  it('comes with whole cakes that hold on a hot day too, each with what it changes', () => {
    const hot = designWith({
      guests: { allergies: [declares({ allergen: 'egg' })] },
      cake: { coating: coat({ style: 'american' }) },
      setting: { place: 'shade', warmestC: 32 },
    });
    const ways = about(advise(hot), 'allergen:egg')?.ways ?? [];
    expect(ways.length).toBeGreaterThan(0);
    for (const way of ways) {
      const then = after(hot, way);
      expect(about(then, 'allergen:egg')).toBeUndefined();
      // American holds to 26 °C: pressing once changes the sponge and what melts.
      expect(then.filter((it) => it.code === 'heat' && it.level === 'stop')).toEqual([]);
    }
    expect(ways[0]?.changes).toEqual([
      'Vanilla sponge becomes Dark cocoa sponge.',
      'American buttercream, smooth becomes Fondant over American, smooth.',
    ]);
  });

  it('keeps the cake inside until it is cut where no coat without it would hold', () => {
    const burning = designWith({
      guests: { allergies: [declares({ allergen: 'egg' })] },
      setting: { place: 'sun', warmestC: 34 },
    });
    const [way] = about(advise(burning), 'allergen:egg')?.ways ?? [];
    expect(way?.patch.setting).toMatchObject({ place: 'indoors', warmestC: 22 });
    expect(after(burning, way).filter((it) => it.level === 'stop')).toEqual([]);
  });

  it('tells whoever bakes it plainly, with the owner’s word', () => {
    const plain = (severity: 'avoids' | 'allergy' | 'anaphylaxis') =>
      about(advise(designWith({ guests: { allergies: [declares({ severity })] } })), 'allergen:egg')
        ?.plain;
    expect(plain('allergy')).toBe(
      'Contains egg: Vanilla sponge and Swiss meringue buttercream. Declared: allergy, 1 guest. The owner’s table: take after talking.',
    );
    expect(plain('anaphylaxis')).toContain('The owner’s table: refuse.');
    expect(plain('avoids')).toContain('The owner’s table: take.');
  });

  it('takes the owner’s strictest word where several are declared', () => {
    const found = about(
      advise(
        designWith({
          guests: {
            allergies: [declares({ severity: 'coeliac' }), declares({ severity: 'allergy' })],
          },
        }),
      ),
      'allergen:egg',
    );
    expect(found).toMatchObject({ talk: false });
  });

  it('leads out through decorations too', () => {
    const decorated = designWith({
      guests: { allergies: [declares({ allergen: 'tree-nuts', severity: 'anaphylaxis' })] },
      look: {
        decorations: [
          { decorationId: 'marzipan', tier: 0, quantity: 4, colour: null, source: 'studio' },
        ],
      },
    });
    const found = about(advise(decorated), 'allergen:tree-nuts');
    expect(found?.ways.map((it) => it.label)).toEqual(['Leave out Marzipan fruit']);
    expect(about(after(decorated, found?.ways[0]), 'allergen:tree-nuts')).toBeUndefined();
  });

  it('offers cakes that suit every guest at once where there are any', () => {
    const both = designWith({
      guests: { allergies: [declares({ allergen: 'egg' })], diets: ['vegan'] },
    });
    const ways = about(advise(both), 'allergen:egg')?.ways ?? [];
    const cake = ways[0]?.patch.cake;
    // Nothing on this menu coats a cake without milk, so the way answers the allergy alone.
    expect(cake?.coating?.style).toBe('american');
    expect(after(both, ways[0]).find((it) => it.code === 'diet')).toBeDefined();
  });

  it('follows the owner’s word: refused, after talking, or taken', () => {
    const answer = (severity: 'anaphylaxis' | 'allergy' | 'avoids') =>
      about(
        advise(designWith({ guests: { allergies: [declares({ severity })] } })),
        'allergen:egg',
      );
    expect(answer('anaphylaxis')).toMatchObject({ level: 'stop', talk: false });
    expect(answer('allergy')).toMatchObject({ level: 'stop', talk: true });
    expect(answer('avoids')).toMatchObject({ level: 'stop', talk: true });
    const nuts = designWith({
      guests: { allergies: [declares({ allergen: 'tree-nuts' })] },
      cake: { tiers: [roundTier(10, { fillingId: 'hazelnut' })] },
    });
    expect(about(advise(nuts), 'allergen:tree-nuts')?.talk).toBe(false);
  });

  it('is one subject for several guests, as grave as the gravest', () => {
    const several = designWith({
      guests: {
        allergies: [declares({ severity: 'avoids', guests: 2 }), declares({ severity: 'allergy' })],
      },
    });
    const found = advise(several).filter((it) => it.about === 'allergen:egg');
    expect(found).toHaveLength(1);
    expect(found[0]?.sentence).toContain('3 guests are allergic to it');
  });
});

describe('a species', () => {
  const withFilling = (species: string) =>
    designWith({
      guests: { allergies: [declares({ allergen: 'tree-nuts', species })] },
      cake: { tiers: [roundTier(10, { fillingId: 'hazelnut' })] },
    });

  it('that is in the cake is a stop', () => {
    expect(about(advise(withFilling('hazelnut')), 'allergen:tree-nuts:hazelnut')?.sentence).toBe(
      'Hazelnut is in Hazelnut cream filling; one guest is allergic to it.',
    );
  });

  it('that is not named is told of its cousin', () => {
    expect(about(advise(withFilling('pecan')), 'near:tree-nuts:pecan')).toMatchObject({
      level: 'care',
      sentence: 'You named pecan; this cake has hazelnut in it or in a warning on a label.',
    });
  });

  it('does not matter to coeliac disease: every gluten cereal counts', () => {
    const rye: Menu = {
      ...menuFixture,
      sponges: menuFixture.sponges.map((it) => ({
        ...it,
        contents: { ...it.contents, allergens: [entry('gluten-cereals', ['rye'])] },
      })),
    };
    const design = designWith({
      guests: {
        allergies: [
          declares({ allergen: 'gluten-cereals', species: 'wheat', severity: 'coeliac' }),
        ],
      },
    });
    const found = about(advise(design, rye), 'allergen:gluten-cereals');
    expect(found?.sentence).toContain('one guest has celiac disease');
  });

  it('left open on a label may be any of them', () => {
    const mixed: Menu = {
      ...menuFixture,
      fillings: menuFixture.fillings.map((it) => ({
        ...it,
        contents: { ...it.contents, allergens: [entry('tree-nuts')] },
      })),
    };
    expect(about(advise(withFilling('pecan'), mixed), 'allergen:tree-nuts:pecan')?.level).toBe(
      'stop',
    );
  });
});

describe('what is not known', () => {
  it('is a stop, never none', () => {
    const design = designWith({
      guests: { allergies: [declares({ allergen: 'sulphites' })] },
      cake: { tiers: [roundTier(8, { fillingId: 'apricot' })] },
    });
    expect(about(advise(design), 'allergen-unknown:sulphites')).toMatchObject({
      level: 'stop',
      talk: true,
      sentence:
        'We do not know yet about sulfites in Apricot filling; one guest is allergic to them.',
    });
  });

  it('includes what somebody else brings to be eaten', () => {
    const design = designWith({
      guests: { allergies: [declares({ allergen: 'peanut' })] },
      look: {
        decorations: [
          { decorationId: 'marzipan', tier: 0, quantity: 4, colour: null, source: 'customer' },
        ],
      },
    });
    expect(about(advise(design), 'allergen-unknown:peanut')?.level).toBe('stop');
  });

  it('told in words waits for a baker', () => {
    const design = designWith({
      guests: { allergies: [declares({ allergen: null, text: 'kiwi' })] },
    });
    expect(about(advise(design), 'allergy-text:kiwi')).toMatchObject({
      level: 'stop',
      step: 'day',
      talk: true,
    });
  });
});

describe('a maker’s warning', () => {
  it.each([
    ['avoids', 'care'],
    ['intolerance', 'care'],
    ['allergy', 'stop'],
    ['anaphylaxis', 'stop'],
  ] as const)('for %s is %s', (severity, level) => {
    const design = designWith({
      guests: { allergies: [declares({ allergen: 'peanut', severity })] },
      cake: { tiers: [roundTier(8, { fillingId: 'hazelnut' })] },
    });
    expect(about(advise(design), 'may-contain:peanut')?.level).toBe(level);
  });
});

describe('what the kitchen handles', () => {
  it.each([
    ['avoids', 'care', false],
    ['intolerance', 'care', false],
    ['allergy', 'care', false],
    ['coeliac', 'stop', true],
    ['anaphylaxis', 'stop', true],
  ] as const)('for %s is %s', (severity, level, talk) => {
    const design = designWith({
      guests: { allergies: [declares({ allergen: 'sesame', severity })] },
    });
    expect(about(advise(design), 'kitchen:sesame')).toMatchObject({ level, talk, step: 'day' });
  });

  it('is said before any cake is designed', () => {
    const design = designWith({
      cake: null,
      guests: { allergies: [declares({ allergen: 'egg', severity: 'anaphylaxis' })] },
    });
    expect(about(advise(design), 'kitchen:egg')?.level).toBe('stop');
  });

  it('says nothing about what is neither in the cake nor in the kitchen', () => {
    const design = designWith({ guests: { allergies: [declares({ allergen: 'lupin' })] } });
    expect(advise(design).filter((it) => it.about.endsWith('lupin'))).toEqual([]);
  });
});

describe('diets', () => {
  it('are told what does not go with them, part by part', () => {
    const design = designWith({
      guests: { diets: ['vegetarian'] },
      cake: { coating: coat({ covering: 'fondant' }) },
    });
    const found = about(advise(design), 'diet:vegetarian');
    expect(found).toMatchObject({ level: 'care', sentence: 'Not vegetarian: Fondant (gelatine).' });
    for (const way of found?.ways ?? []) {
      expect(about(after(design, way), 'diet:vegetarian')).toBeUndefined();
    }
  });

  it('that need a certificate say so even where the ingredients agree', () => {
    const found = about(advise(designWith({ guests: { diets: ['halal'] } })), 'diet:halal');
    expect(found?.sentence).toContain('ask us which of ours carry a certificate');
  });

  it('without alcohol see the rum', () => {
    const design = designWith({
      guests: { diets: ['no-alcohol'] },
      cake: { tiers: [roundTier(8, { fillingId: 'rum-caramel' })] },
    });
    expect(about(advise(design), 'diet:no-alcohol')?.sentence).toBe(
      'Alcohol is in Rum caramel filling.',
    );
  });
});
