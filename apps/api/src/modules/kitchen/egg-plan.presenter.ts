import type { EggPlanView } from '#shared/contracts/kitchen-sheet.ts';
import type { JointEggPlan } from '#shared/kitchen/eggs/joint-plan.ts';
import type { EggPlanOfSpan } from './egg-plan.queries.ts';

/** Which eggs to crack on which day, as bakers read it. */
export function presentEggPlan({ joint, ...asked }: EggPlanOfSpan): EggPlanView {
  const { from, to, size, whiteDays, yolkDays, orders, unplaced } = asked;
  return {
    from,
    to,
    size,
    whiteDays,
    yolkDays,
    ...presentJoint(joint),
    orders: [...orders],
    unplaced: [...unplaced],
  };
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
