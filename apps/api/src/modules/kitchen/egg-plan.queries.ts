import type { EggPlanView, EggSizeName } from '#shared/contracts/kitchen-sheet.ts';
import { jointEggPlan } from '#shared/kitchen/eggs/joint-plan.ts';
import type { JointEggPlan } from '#shared/kitchen/eggs/joint-plan.ts';
import { eggKeeping } from '#shared/kitchen/eggs/plan-eggs.ts';
import { eggTasksOf, needsOfSpan } from './span-needs.queries.ts';
import type { Span } from './span-needs.queries.ts';

export type EggQuestion = Span & {
  readonly size?: EggSizeName;
  readonly whiteDays?: number;
  readonly yolkDays?: number;
};

/** Which eggs to crack on which day for everything that is made in a span. */
export async function planEggsOfSpan(question: EggQuestion): Promise<EggPlanView> {
  const { from, to, size = 'large', whiteDays, yolkDays } = question;
  const keeping = {
    whiteDays: whiteDays ?? eggKeeping.whiteDays,
    yolkDays: yolkDays ?? eggKeeping.yolkDays,
  };
  const span = await needsOfSpan({ from, to });
  const joint = jointEggPlan(eggTasksOf(span), span.index, { size, keeping });
  const { orders, unplaced } = span;
  return { from, to, size, ...keeping, ...presentJoint(joint), orders, unplaced };
}

function presentJoint(
  joint: JointEggPlan,
): Pick<EggPlanView, 'eggs' | 'days' | 'leftovers' | 'cartons' | 'alternatives'> {
  return {
    eggs: joint.shell.eggs,
    days: joint.shell.days.map(({ date, crack, whole, uses }) => ({
      date,
      crack,
      whole,
      uses: uses.map(({ need, from }) => ({
        formula: need.formulaName,
        orders: [...need.orders],
        part: need.part,
        grams: need.grams,
        from: [...from],
      })),
    })),
    leftovers: joint.leftovers.map((it) => ({ ...it, uses: [...it.uses] })),
    cartons: joint.cartons.map(({ ingredient, tasks, grams, plan }) => ({
      name: ingredient.name,
      grams,
      formulas: [...new Set(tasks.map((it) => it.formulaName))],
      plan: plan === null ? null : { ...plan, days: [...plan.days] },
    })),
    alternatives: joint.alternatives.map(({ formulaName, ingredient, ...it }) => ({
      ...it,
      formula: formulaName,
      carton: ingredient.name,
    })),
  };
}
