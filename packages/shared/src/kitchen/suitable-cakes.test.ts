import { describe, expect, it } from 'vitest';
import { evaluateDesign } from './evaluate-design.ts';
import { suitableCakes } from './suitable-cakes.ts';
import { declares, designWith } from './testing/design-fixture.ts';
import { menuFixture } from './testing/menu-fixture.ts';

const egg = { guests: { allergies: [declares({ allergen: 'egg' })] } };
const date = '2027-07-17';
const today = '2027-05-01';

describe('whole cakes for the table', () => {
  it('have no part that a guest cannot eat, and hold in a hot garden', () => {
    const design = designWith({ ...egg, setting: { place: 'shade', warmestC: 32 } });
    const cakes = suitableCakes({ design, date }, menuFixture, today);
    // Fondant holds to 35 °C on this menu; every buttercream is past its limit.
    expect(cakes.length).toBeGreaterThan(0);
    for (const { level, contains, way, name, totalMinor } of cakes) {
      expect(level, name).not.toBe('stop');
      expect(contains, name).not.toContain('egg');
      const { advice, price } = evaluateDesign(
        { design: { ...design, ...way?.patch }, date },
        menuFixture,
        today,
      );
      expect(advice.filter((it) => it.level === 'stop')).toEqual([]);
      expect(totalMinor).toBe(price.totalMinor);
    }
    expect(cakes[0]?.name).toMatch(/^Dark cocoa sponge, Raspberry jam filling and Fondant over/);
  });

  it('are named before anything is designed', () => {
    const cakes = suitableCakes(
      { design: designWith({ ...egg, cake: null, setting: null }), date },
      menuFixture,
      today,
    );
    expect(cakes[0]).toMatchObject({ way: null });
    expect(cakes[0]?.holds).toMatch(/^Holds to/);
  });

  it('are none where the menu makes none', () => {
    const design = designWith({ guests: { diets: ['vegan'] } });
    const vegan = suitableCakes(
      { design, date },
      { ...menuFixture, sponges: menuFixture.sponges.slice(0, 1) },
      today,
    );
    expect(vegan).toEqual([]);
  });
});
