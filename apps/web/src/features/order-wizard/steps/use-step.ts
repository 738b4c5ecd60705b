import { useEffect, useState } from 'react';
import { useFormContext, useFormState } from 'react-hook-form';
import { useLocation, useNavigate } from 'react-router-dom';
import { paths, type OrderStep } from '#web/config/paths.ts';
import { type FieldProblem, listFieldProblems } from '#web/lib/forms.ts';
import type { OrderForm } from '../draft/empty-order.ts';
import { useWizard } from '../wizard/wizard-context.ts';
import { issuesOfStep, stepOfPath } from './check-step.ts';
import { stepAfter } from './steps.ts';

/** What one page of the wizard tells the next through the browser's own history. */
type Passed = {
  /** Came from the last page to change one answer; the way on leads back there. */
  readonly fromCheck?: true;
  /** Was sent here because something is still missing. */
  readonly missing?: true;
};

function passed(state: unknown): Passed {
  if (typeof state !== 'object' || state === null) return {};
  return {
    ...('fromCheck' in state && state.fromCheck === true && { fromCheck: true }),
    ...('missing' in state && state.missing === true && { missing: true }),
  };
}

/** Came to change one answer: for links from the last page. */
export const fromCheck: Passed = { fromCheck: true };
/** Sent to what is missing: for the guard. */
export const missing: Passed = { missing: true };

export type StepFlow = {
  readonly problems: readonly FieldProblem[];
  /** Grows with every try to go on, so that focus goes to the summary each time. */
  readonly attempt: number;
  /** Where the way on leads. */
  readonly next: OrderStep | null;
  /** Checks the step; goes on if nothing is missing, else shows what is. */
  readonly goOn: () => void;
};

/** Going ahead from a step: its answers are checked first, and what is missing is listed. */
export function useStep(step: OrderStep): StepFlow {
  const location = useLocation();
  const { hash } = location;
  const navigate = useNavigate();
  const { values, reach } = useWizard();
  const { trigger, getValues, clearErrors, control } = useFormContext<OrderForm>();
  const { errors } = useFormState({ control });
  const { fromCheck: returning, missing: sentHere } = passed(location.state);
  const [attempt, setAttempt] = useState(sentHere === true ? 1 : 0);
  const next = returning === true && step !== 'check' ? 'check' : stepAfter(step);

  useEffect(() => {
    clearErrors();
    reach(step);
  }, [step, clearErrors, reach]);

  // A link to one answer ends at its field.
  useEffect(() => {
    const field = hash === '' ? null : document.getElementById(hash.slice(1));
    field?.closest('details')?.setAttribute('open', '');
    field?.scrollIntoView({ block: 'center' });
    field?.focus({ preventScroll: true });
  }, [hash]);

  // Once the customer has tried to go on, the list shrinks as answers come in.
  useEffect(() => {
    if (attempt > 0) void trigger();
  }, [attempt, values, trigger]);

  const goOn = () => {
    if (issuesOfStep(step, getValues()).length > 0 || next === null) {
      setAttempt((count) => count + 1);
      return;
    }
    void navigate(paths.orderStep(next), { state: null });
  };

  const problems = listFieldProblems(errors).filter(({ name }) => stepOfPath(name) === step);
  return { problems: attempt > 0 ? problems : [], attempt, next, goOn };
}
