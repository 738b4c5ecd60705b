import { Suspense, lazy } from 'react';
import { Pending } from '#web/components/ui/pending.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import type { OrderStep } from '#web/config/paths.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { panelTitle } from './panel-title.ts';

const CakePanel = lazy(async () => ({ default: (await import('./cake-panel.tsx')).CakePanel }));

/** On a wide screen the rimmed surface beside the answers: the drawing, the estimate, the advice. */
export function SidePanel({ step }: { readonly step: OrderStep }) {
  const { values, design } = useWizard();
  return (
    <div data-print="no" className="hidden lg:order-first lg:block">
      <Rim
        label="Your cake so far"
        className="sticky top-6 grid max-h-[calc(100dvh-3rem)] gap-4 overflow-y-auto p-6"
      >
        <div className="flex items-baseline justify-between gap-4">
          <h2 className="text-xl">{panelTitle(values, design)}</h2>
          {design?.cake && <span className="shrink-0 text-sm text-slate">to scale</span>}
        </div>
        {design?.cake ? (
          <Suspense fallback={<Pending what="Drawing your cake…" />}>
            <CakePanel step={step} />
          </Suspense>
        ) : (
          <EmptyBoard />
        )}
      </Rim>
    </div>
  );
}

/** Before there is a cake: the board it will stand on, and what has been promised so far. */
function EmptyBoard() {
  return (
    <div className="grid gap-4">
      <svg viewBox="0 0 420 300" className="block w-full" aria-hidden="true">
        <path d="M60 258h300" stroke="var(--color-ink)" strokeWidth="5" strokeLinecap="round" />
        <path
          d="M110 255v-92h200v92M150 163V83h120v80"
          fill="none"
          stroke="var(--color-seam)"
          strokeWidth="2"
          strokeDasharray="7 7"
        />
      </svg>
      <p className="text-slate">
        Nothing is booked yet. Once you choose a cake it is drawn here, with what it costs and what
        to look after.
      </p>
    </div>
  );
}
