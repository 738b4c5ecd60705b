import { CakeDrawing } from '#web/components/cake-drawing/cake-drawing.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import type { OrderStep } from '#web/config/paths.ts';
import { asItComesOut } from '../../design/as-it-comes-out.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { AdviceList } from './advice-list.tsx';
import { EstimateLines } from './estimate-lines.tsx';

type Props = {
  readonly step: OrderStep;
  readonly onLeave?: () => void;
};

/** The drawing to scale, the running estimate under it, then the advice. */
export function CakePanel({ step, onLeave }: Props) {
  const { menu, design, running } = useWizard();
  const { estimate, failed, retry } = running;
  const cake = design?.cake ? asItComesOut(design.cake, menu) : null;
  return (
    <div className="grid gap-4">
      <CakeDrawing cake={cake} look={design?.look ?? null} menu={menu} />
      {failed && estimate === null && <Failure error={new Error('rules')} onRetry={retry} />}
      {!failed && estimate === null && design !== null && <Pending what="Working it out…" />}
      {/* The last page has the price and the advice among its answers. */}
      {estimate !== null && step !== 'check' && (
        <>
          <EstimateLines estimate={estimate} locale={menu.studio.locale} />
          <AdviceList
            step={step}
            advice={estimate.advice}
            keepCool={estimate.keepCool}
            onLeave={onLeave}
          />
        </>
      )}
    </div>
  );
}
