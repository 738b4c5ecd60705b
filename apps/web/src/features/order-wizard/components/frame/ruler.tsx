import { Link } from 'react-router-dom';
import { orderSteps, paths, type OrderStep } from '#web/config/paths.ts';
import { classNames } from '#web/lib/class-names.ts';
import { stepIndex, steps } from '../../steps/steps.ts';
import { useWizard } from '../../wizard/wizard-context.ts';

const ticks = Array.from({ length: 9 }, (_, at) => (at + 1) * 10);

/** How far along the ruler a step reaches: its own part is filled a little past its middle. */
function filled(step: OrderStep): string {
  return `${((stepIndex(step) + 0.6) / orderSteps.length) * 100}%`;
}

/** The order's six steps along a ruler that fills with butter; every step reached is a link. */
export function Ruler({ step }: { readonly step: OrderStep }) {
  const { reached } = useWizard();
  return (
    <nav aria-label="Steps of the order" data-print="no" className="overflow-x-clip">
      <div className="page">
        <div className="relative h-4 md:h-11">
          <div
            aria-hidden="true"
            className="absolute inset-y-0 -left-[50vw] bg-butter-tint transition-[width] duration-200 ease-world"
            style={{ width: `calc(50vw + ${filled(step)})` }}
          />
          <ol className="relative grid h-full grid-cols-6">
            {orderSteps.map((id) => (
              <li key={id} className="relative border-l-[1.5px] border-cobalt/70">
                <svg
                  className="absolute inset-x-0 top-0 h-2.5 w-full text-cobalt"
                  aria-hidden="true"
                >
                  {ticks.map((at) => (
                    <line
                      key={at}
                      x1={`${at}%`}
                      x2={`${at}%`}
                      y1="0"
                      y2={at === 50 ? 10 : 6}
                      stroke="currentColor"
                      strokeWidth="1"
                    />
                  ))}
                </svg>
                <StepName
                  id={id}
                  current={id === step}
                  open={stepIndex(id) <= stepIndex(reached)}
                />
              </li>
            ))}
          </ol>
        </div>
      </div>
    </nav>
  );
}

type NameProps = { readonly id: OrderStep; readonly current: boolean; readonly open: boolean };

function StepName({ id, current, open }: NameProps) {
  const classes = classNames(
    'hidden h-full items-end pb-1.5 pl-2 text-sm leading-tight md:flex',
    current ? 'font-bold text-ink' : 'font-medium',
  );
  if (!open) return <span className={classNames(classes, 'text-slate')}>{steps[id].name}</span>;
  return (
    <Link
      to={paths.orderStep(id)}
      aria-current={current ? 'step' : undefined}
      className={classNames(classes, !current && 'text-cobalt hover:underline')}
    >
      {steps[id].name}
    </Link>
  );
}
