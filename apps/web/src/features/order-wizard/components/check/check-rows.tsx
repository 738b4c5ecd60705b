import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { paths, type OrderStep } from '#web/config/paths.ts';
import { fieldId } from '#web/lib/forms.ts';
import { steps } from '../../steps/steps.ts';
import { fromCheck } from '../../steps/use-step.ts';

/** One answer, and the field that it was given in. */
export type CheckRow = {
  readonly label: string;
  readonly value: ReactNode;
  readonly field: string;
};

type Props = { readonly step: OrderStep; readonly rows: readonly CheckRow[] };

/** The answers of one step, each with the way back to it. */
export function CheckRows({ step, rows }: Props) {
  return (
    <section className="grid gap-1" aria-labelledby={`check-${step}`}>
      <h2 id={`check-${step}`}>{steps[step].name}</h2>
      <dl className="grid">
        {rows.map(({ label, value, field }) => (
          <div
            key={`${field} ${label}`}
            className="grid grid-cols-[1fr_auto] gap-x-4 border-b border-seam py-1.5 sm:grid-cols-[11rem_1fr_auto] sm:items-center"
          >
            <dt className="text-slate max-sm:col-start-1">{label}</dt>
            <dd className="min-w-0 max-sm:col-start-1">{value}</dd>
            <dd className="max-sm:col-start-2 max-sm:row-span-2 max-sm:row-start-1">
              <Link
                to={`${paths.orderStep(step)}#${fieldId(field)}`}
                state={fromCheck}
                aria-label={`Change: ${label}`}
                className="link inline-flex min-h-11 items-center"
              >
                Change
              </Link>
            </dd>
          </div>
        ))}
      </dl>
    </section>
  );
}
