import { describe, expect, it } from 'vitest';
import { addDays } from '#shared/dates/local-time.ts';
import { indexPantry } from '../formulas/pantry-index.ts';
import { smallPantry } from '../needs/testing/small-pantry.ts';
import { leftoverUses } from './egg-uses.ts';
import { eggsAlone, jointEggPlan, type EggTask } from './joint-plan.ts';

const index = indexPantry(smallPantry);
const monday = '2027-06-07';

function task(id: string, date: string, grams: number, formulaId: string): EggTask {
  const ingredient = index.ingredients.get(id);
  if (ingredient === undefined || ingredient.eggPart === null) throw new Error(id);
  const { eggPart: part } = ingredient;
  return { date, formulaId, formulaName: formulaId, ingredient, part, grams, orders: [2421] };
}

describe('the joint plan', () => {
  const week = jointEggPlan(
    [
      task('white', monday, 660, 'swiss'),
      task('egg', addDays(monday, 1), 500, 'vanilla-sponge'),
      task('yolk-carton', addDays(monday, 5), 400, 'french'),
    ],
    index,
  );

  it('cracks for all of them together', () => {
    // Twenty for the whites; their yolks are good on Tuesday and stand for the whole eggs' yolks,
    // so Tuesday cracks only for the white in 500 g: 330 g, ten eggs.
    expect(week.shell.days.map((it) => it.crack)).toEqual([20, 10]);
  });

  it('says what the leftovers could become, and which of it is written for pasteurised egg', () => {
    const uses = leftoverUses({ whiteG: 0, yolkG: 340 }, index);
    expect(uses).toMatchObject([
      { formulaId: 'yolk-curd', part: 'yolk', pasteurised: false },
      { formulaId: 'french', part: 'yolk', pasteurised: true },
    ]);
    expect(uses[0]?.outG).toBeCloseTo(1700, 6);
    expect(uses[1]?.outG).toBeCloseTo(340 * 4.6, 6);
    expect(week.leftovers.flatMap((it) => it.uses).length).toBeGreaterThan(0);
  });

  it('counts a formula with whole eggs only where both parts are left', () => {
    const uses = leftoverUses({ whiteG: 330, yolkG: 170 }, index);
    const sponge = uses.find((it) => it.formulaId === 'vanilla-sponge');
    // 500 g of egg: 250 g of it in 1,200 g of batter, 1,080 baked.
    expect(sponge).toMatchObject({ part: 'whole' });
    expect(sponge?.outG).toBeCloseTo(2160, 6);
  });

  it('opens cartons apart from the eggs', () => {
    expect(week.cartons).toMatchObject([
      { grams: 400, plan: { cartons: 1, days: [{ date: addDays(monday, 5), open: 1 }] } },
    ]);
  });

  it('offers the carton where a formula takes one part alone, with the note about whipping', () => {
    expect(week.alternatives).toMatchObject([
      {
        formulaId: 'swiss',
        part: 'white',
        ingredient: { id: 'white-carton' },
        cartons: 1,
        eggs: 10,
        fewer: 20,
        whipped: true,
      },
    ]);
  });

  it('says what one order alone would crack', () => {
    const needs = [task('white', monday, 330, 'swiss'), task('egg', monday, 100, 'sponge')];
    expect(eggsAlone(needs)).toEqual({ crack: 12, leftWhiteG: 0, leftYolkG: 170 });
  });
});
