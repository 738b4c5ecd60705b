import { submitOrder } from '#shared/contracts/orders.ts';
import type { OrderForm } from '../draft/empty-order.ts';
import { orderSteps, type OrderStep } from '#web/config/paths.ts';
import { tidyOrder } from '../design/tidy-order.ts';
import { stepIndex } from './steps.ts';

/** One thing to put right: where it is in the form, and what to do. */
export type StepIssue = { readonly path: string; readonly message: string };

/**
 * What to say where a number is missing or cannot be read; the contract only knows that it is not
 * a number. Paths are written with `*` for a position in a list.
 */
const unreadable: Readonly<Record<string, string>> = {
  'day.headCount': 'Write how many people will eat, as a whole number.',
  'day.allergies.*.guests': 'Write how many guests, as a whole number.',
  'setting.warmestC': 'Write a temperature like 77 °F or 25 °C, or choose “I don’t know”.',
  'setting.minutesOut': 'Write a time like 45 min or 1 h 30 min.',
  'setting.driveMinutes': 'Write a time like 25 min, or 0 if it is next door.',
  'setting.servedAt': 'Write a time like 16:00 or 4 pm, or leave it empty.',
  'look.decorations.*.quantity': 'Write how many, as a whole number.',
  'extras.*.quantity': 'Write how many, as a whole number.',
  'cake.tiers.*.heightMm': 'Choose how high this tier is.',
};

/** Which step asks for the answer at this path of the form. */
export function stepOfPath(path: string): OrderStep {
  if (path.startsWith('day')) return 'day';
  if (path.startsWith('cake.coating') || /^cake\.tiers\.\d+\.coating/.test(path)) return 'setting';
  if (path.startsWith('cake')) return 'cake';
  if (path.startsWith('setting')) return 'setting';
  if (path.startsWith('look') || path.startsWith('photos') || path.startsWith('extras')) {
    return 'look';
  }
  if (path.startsWith('you') || path.startsWith('consents')) return 'you';
  return 'check';
}

/** The path with every list position written as `*`. */
export function generalPath(path: string): string {
  return path
    .split('.')
    .map((part) => (/^\d+$/.test(part) ? '*' : part))
    .join('.');
}

/**
 * Everything the contract would refuse in these answers, one issue a path, in the form's order. The
 * choice of a coat is added by hand: a cross-field rule of the contract is silent while any other
 * answer has the wrong type, and the setting step must not depend on that.
 */
export function issuesOf(values: OrderForm): StepIssue[] {
  const parsed = submitOrder.safeParse(tidyOrder(values));
  if (parsed.success) return [];
  const issues: StepIssue[] = [];
  for (const issue of parsed.error.issues) {
    const path = issue.path.map(String).join('.');
    if (issues.some((known) => known.path === path)) continue;
    const words = issue.code === 'invalid_type' ? unreadable[generalPath(path)] : undefined;
    issues.push({ path, message: words ?? issue.message });
  }
  if (values.cake.coating === null && !issues.some((issue) => issue.path === 'cake.coating')) {
    issues.push({ path: 'cake.coating', message: 'Choose what goes over the cake.' });
  }
  return issues;
}

/** What still keeps somebody from leaving this step. */
export function issuesOfStep(step: OrderStep, values: OrderForm): StepIssue[] {
  return issuesOf(values).filter((issue) => stepOfPath(issue.path) === step);
}

/** The first step that is not answered yet, or null if the order could be sent. */
export function firstUnfinishedStep(values: OrderForm): OrderStep | null {
  const open = new Set(issuesOf(values).map((issue) => stepOfPath(issue.path)));
  return orderSteps.find((id) => open.has(id)) ?? null;
}

/** Whether the address of a step may be shown, or where to go instead: nothing may be skipped. */
export function allowedStep(wanted: OrderStep, values: OrderForm): OrderStep {
  const unfinished = firstUnfinishedStep(values);
  if (unfinished === null) return wanted;
  return stepIndex(wanted) <= stepIndex(unfinished) ? wanted : unfinished;
}
