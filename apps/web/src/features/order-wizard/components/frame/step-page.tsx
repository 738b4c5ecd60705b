import { type ReactNode, Suspense, lazy } from 'react';
import { Link } from 'react-router-dom';
import { Button } from '#web/components/ui/button.tsx';
import { FormErrorSummary } from '#web/components/ui/form-error-summary.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { paths, type OrderStep } from '#web/config/paths.ts';
import { stepBefore, steps } from '../../steps/steps.ts';
import { useStep } from '../../steps/use-step.ts';
import { BottomBar } from './bottom-bar.tsx';

/** The first page has the calendar itself. */
const DateWatch = lazy(async () => ({ default: (await import('./date-watch.tsx')).DateWatch }));

type Props = {
  readonly step: OrderStep;
  readonly children: ReactNode;
};

/** One page of the wizard: its question, what is missing, the answers, the ways on and back. */
export function StepPage({ step, children }: Props) {
  const { problems, attempt, next, goOn } = useStep(step);
  const before = stepBefore(step);
  return (
    <form
      noValidate
      className="grid min-w-0 gap-8"
      onSubmit={(event) => {
        event.preventDefault();
        goOn();
      }}
    >
      <div className="grid gap-4">
        <PageTitle title={steps[step].question} />
        <FormErrorSummary problems={problems} attempt={attempt} />
      </div>
      {children}
      {step !== 'day' && (
        <Suspense>
          <DateWatch />
        </Suspense>
      )}
      <BottomBar
        step={step}
        action={next !== null && <Button type="submit">{steps[next].onwards}</Button>}
        back={
          before !== null && (
            <Link to={paths.orderStep(before)} className="link inline-flex min-h-11 items-center">
              {steps[before].backwards}
            </Link>
          )
        }
      />
    </form>
  );
}
