import * as z from 'zod/mini';
import { localDate } from '#shared/contracts/common.ts';
import { dateReason } from '#shared/contracts/dates.ts';
import { type Estimate, estimate } from '#shared/contracts/estimates.ts';
import { describeFailure } from '#web/lib/describe-failure.ts';
import { ApiProblem, NetworkProblem } from '#web/lib/http.ts';
import { stepOfPath, type StepIssue } from '../steps/check-step.ts';

/** Why an order was not taken, with what the customer can do about it. */
export type SendRefusal =
  | { readonly kind: 'lost' }
  | { readonly kind: 'date-gone'; readonly sentence: string; readonly nearest: readonly string[] }
  | {
      readonly kind: 'price-changed';
      readonly estimate: Estimate;
      readonly seenMinor: number | null;
    }
  | { readonly kind: 'answers'; readonly issues: readonly StepIssue[] }
  | { readonly kind: 'photos-under-way' }
  | { readonly kind: 'sign-in'; readonly title: string }
  | { readonly kind: 'other'; readonly title: string; readonly detail: string };

const dateGoneFacts = z.object({
  nearest: z.array(localDate),
  reason: z.nullable(dateReason),
});
const priceFacts = z.object({ estimate, seenTotalMinor: z.nullable(z.int()) });

/** Whether the order may have been taken although no clear answer came. */
export function isUnclear(error: unknown): boolean {
  return error instanceof NetworkProblem || (error instanceof ApiProblem && error.status >= 500);
}

/** Reads a failed try at sending. */
export function readRefusal(error: unknown): SendRefusal {
  if (isUnclear(error)) return { kind: 'lost' };
  if (!(error instanceof ApiProblem)) return { kind: 'other', ...describeFailure(error) };
  switch (error.code) {
    case 'date-gone': {
      const facts = dateGoneFacts.safeParse(error.facts);
      return {
        kind: 'date-gone',
        sentence: error.detail,
        nearest: facts.success ? facts.data.nearest : [],
      };
    }
    case 'price-changed': {
      const facts = priceFacts.safeParse(error.facts);
      if (!facts.success) return { kind: 'other', title: error.message, detail: error.detail };
      return {
        kind: 'price-changed',
        estimate: facts.data.estimate,
        seenMinor: facts.data.seenTotalMinor,
      };
    }
    case 'invalid-input':
      return {
        kind: 'answers',
        issues: error.issues.map(({ path, message }) => ({ path: path.join('.'), message })),
      };
    case 'not-signed-in':
    case 'second-factor-needed':
      return { kind: 'sign-in', title: error.message };
    default:
      return { kind: 'other', title: error.message, detail: error.detail };
  }
}

/** Where the answer behind an issue is given; what belongs nowhere stays on the last page. */
export function stepOfIssue({ path }: StepIssue) {
  return stepOfPath(path);
}
