import { orderSteps, type OrderStep } from '#web/config/paths.ts';

export type Step = {
  readonly id: OrderStep;
  /** The word on the ruler. */
  readonly name: string;
  /** The page's heading. */
  readonly question: string;
  /** The button that leads here from the step before. */
  readonly onwards: string;
  /** The link that leads back here from the step after. */
  readonly backwards: string;
};

export const steps: Readonly<Record<OrderStep, Step>> = {
  day: {
    id: 'day',
    name: 'The day',
    question: 'How many will eat, and when?',
    onwards: 'On to the day',
    backwards: 'Back to the day',
  },
  cake: {
    id: 'cake',
    name: 'The cake',
    question: 'What shall we bake?',
    onwards: 'On to the cake',
    backwards: 'Back to the cake',
  },
  setting: {
    id: 'setting',
    name: 'Where it goes',
    question: 'Where will it stand?',
    onwards: 'On to where it goes',
    backwards: 'Back to where it goes',
  },
  look: {
    id: 'look',
    name: 'The look',
    question: 'How should it look?',
    onwards: 'On to the look',
    backwards: 'Back to the look',
  },
  you: {
    id: 'you',
    name: 'You',
    question: 'Who is it from?',
    onwards: 'On to you',
    backwards: 'Back to you',
  },
  check: {
    id: 'check',
    name: 'Check',
    question: 'Is all of this right?',
    onwards: 'On to the check',
    backwards: 'Back to the check',
  },
};

/** Whether a part of an address names a step. */
export function isOrderStep(value: string | undefined): value is OrderStep {
  return orderSteps.some((id) => id === value);
}

/** Its place on the ruler, 0 to 5. */
export function stepIndex(id: OrderStep): number {
  return orderSteps.indexOf(id);
}

/** The step after, or null after the last. */
export function stepAfter(id: OrderStep): OrderStep | null {
  return orderSteps[stepIndex(id) + 1] ?? null;
}

/** The step before, or null before the first. */
export function stepBefore(id: OrderStep): OrderStep | null {
  return orderSteps[stepIndex(id) - 1] ?? null;
}

/** Whichever of the two comes later on the ruler. */
export function laterStep(a: OrderStep, b: OrderStep): OrderStep {
  return stepIndex(a) >= stepIndex(b) ? a : b;
}
