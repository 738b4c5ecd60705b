import type { EggSizeName } from '#shared/contracts/kitchen-sheet.ts';
import { jointEggPlan } from '#shared/kitchen/eggs/joint-plan.ts';
import type { JointEggPlan } from '#shared/kitchen/eggs/joint-plan.ts';
import { eggKeeping } from '#shared/kitchen/eggs/plan-eggs.ts';
import { eggTasksOf, needsOfSpan } from './span-needs.queries.ts';
import type { Span, SpanNeeds } from './span-needs.queries.ts';

export type EggQuestion = Span & {
  readonly size?: EggSizeName;
  readonly whiteDays?: number;
  readonly yolkDays?: number;
};

/** The plan with what it was asked for, and the orders it is for. */
export type EggPlanOfSpan = Required<EggQuestion> &
  Pick<SpanNeeds, 'orders' | 'unplaced'> & { readonly joint: JointEggPlan };

/** Which eggs to crack on which day for everything that is made in a span. */
export async function planEggsOfSpan(question: EggQuestion): Promise<EggPlanOfSpan> {
  const { from, to, size = 'large', whiteDays, yolkDays } = question;
  const keeping = {
    whiteDays: whiteDays ?? eggKeeping.whiteDays,
    yolkDays: yolkDays ?? eggKeeping.yolkDays,
  };
  const span = await needsOfSpan({ from, to });
  const joint = jointEggPlan(eggTasksOf(span), span.index, { size, keeping });
  const { orders, unplaced } = span;
  return { from, to, size, ...keeping, joint, orders, unplaced };
}
