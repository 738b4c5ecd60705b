import type { Estimate } from '#shared/contracts/estimates.ts';
import { Failure } from '#web/components/ui/failure.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { useWizard } from '../../wizard/wizard-context.ts';
import { EstimateLines } from '../frame/estimate-lines.tsx';

type Props = {
  readonly estimate: Estimate | null;
  readonly pending: boolean;
  readonly error: unknown;
  readonly onRetry: () => void;
};

/** The price as the studio works it out now; this device's own figure stands in until it is there. */
export function FinalPrice({ estimate, pending, error, onRetry }: Props) {
  const { studio } = useWizard().menu;
  return (
    <section className="grid gap-2" aria-labelledby="price-heading">
      <h2 id="price-heading">What it costs</h2>
      {pending && <Pending what="Asking the studio for its price…" />}
      {error !== null && <Failure error={error} onRetry={onRetry} />}
      {estimate !== null && <EstimateLines estimate={estimate} locale={studio.locale} />}
    </section>
  );
}
