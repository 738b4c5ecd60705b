import { useState } from 'react';
import { Link } from 'react-router-dom';
import { Button } from '#web/components/ui/button.tsx';
import { Drawer } from '#web/components/ui/drawer.tsx';
import { orderSteps, paths, type OrderStep } from '#web/config/paths.ts';
import { classNames } from '#web/lib/class-names.ts';
import { stepIndex, steps } from '../../steps/steps.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { DraftLine } from './draft-line.tsx';

type Props = {
  readonly step: OrderStep;
  readonly signInTo: string | null;
};

/** On a phone: where one is, and behind it the way to the other steps and the draft's own actions. */
export function StepsDrawer({ step, signInTo }: Props) {
  const [open, setOpen] = useState(false);
  const { reached, startOver } = useWizard();
  const close = () => setOpen(false);
  return (
    <>
      <button
        type="button"
        aria-haspopup="dialog"
        className="min-h-11 text-sm whitespace-nowrap text-slate underline decoration-dotted underline-offset-4"
        onClick={() => setOpen(true)}
      >
        {steps[step].name}, {stepIndex(step) + 1} of {orderSteps.length}
      </button>
      <Drawer open={open} onClose={close} title="Your order so far">
        <ol className="grid">
          {orderSteps.map((id, at) => (
            <li key={id} className="border-b border-seam">
              {stepIndex(id) <= stepIndex(reached) ? (
                <Link
                  to={paths.orderStep(id)}
                  onClick={close}
                  aria-current={id === step ? 'step' : undefined}
                  className={classNames(
                    'flex min-h-12 items-center gap-3 px-2 font-semibold',
                    id === step ? 'bg-butter-tint' : 'text-cobalt',
                  )}
                >
                  <span className="tabular-nums">{at + 1}</span> {steps[id].name}
                </Link>
              ) : (
                <span className="flex min-h-12 items-center gap-3 px-2 text-slate">
                  <span className="tabular-nums">{at + 1}</span> {steps[id].name}
                </span>
              )}
            </li>
          ))}
        </ol>
        <p className="text-sm text-slate">
          <DraftLine />
        </p>
        <div className="flex flex-wrap gap-3">
          {signInTo !== null && (
            <Link to={signInTo} className="link inline-flex min-h-11 items-center">
              Sign in
            </Link>
          )}
          <Button
            kind="quiet"
            onClick={() => {
              close();
              startOver();
            }}
          >
            Start over
          </Button>
        </div>
      </Drawer>
    </>
  );
}
