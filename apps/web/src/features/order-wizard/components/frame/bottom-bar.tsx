import { type ReactNode, Suspense, lazy, useState } from 'react';
import { formatMoney } from '#shared/kitchen/money.ts';
import type { OrderStep } from '#web/config/paths.ts';
import { useWizard } from '../../wizard/wizard-context.ts';

const CakeDrawer = lazy(async () => ({ default: (await import('./cake-drawer.tsx')).CakeDrawer }));

type Props = {
  readonly step: OrderStep;
  /** The page's one primary action. */
  readonly action: ReactNode;
  readonly back: ReactNode;
};

/**
 * The way on. On a wide screen it stands under the answers; on a narrow one it stays at the foot
 * of the screen with the running total, which opens the drawing, the estimate and the advice.
 */
export function BottomBar({ step, action, back }: Props) {
  const [open, setOpen] = useState(false);
  // Once opened it stays, so that closing it can give the focus back.
  const [opened, setOpened] = useState(false);
  return (
    <>
      {back && <div className="lg:hidden">{back}</div>}
      <div
        data-print="no"
        // News at the foot of the screen keeps clear of it.
        data-foot
        className="sticky bottom-0 z-10 -mx-[clamp(1rem,3.2vw,2.5rem)] flex items-center justify-between gap-4 border-t border-seam bg-enamel px-[clamp(1rem,3.2vw,2.5rem)] py-3 lg:static lg:mx-0 lg:justify-start lg:border-0 lg:p-0"
      >
        <div className="min-w-0 lg:hidden">
          <RunningTotal
            onOpen={() => {
              setOpened(true);
              setOpen(true);
            }}
          />
        </div>
        <div className="shrink-0">{action}</div>
        <div className="hidden lg:block">{back}</div>
      </div>
      {opened && (
        <Suspense>
          <CakeDrawer step={step} open={open} onClose={() => setOpen(false)} />
        </Suspense>
      )}
    </>
  );
}

function RunningTotal({ onOpen }: { readonly onOpen: () => void }) {
  const { menu, design, running } = useWizard();
  const { estimate } = running;
  if (design === null || design.cake === null) {
    return <p className="text-sm text-slate">Nothing is booked yet</p>;
  }
  const worries = estimate?.advice.filter((it) => it.level !== 'ok').length ?? 0;
  return (
    <button
      type="button"
      aria-haspopup="dialog"
      onClick={onOpen}
      className="grid min-h-11 rounded-mark text-left leading-tight"
    >
      <span className="font-display text-xl font-bold tabular-nums">
        {estimate === null
          ? '…'
          : formatMoney(estimate.price.totalMinor, estimate.price.currency, menu.studio.locale)}
      </span>
      <span className="text-sm font-semibold text-cobalt underline underline-offset-3">
        {worries === 0
          ? 'See your cake'
          : `See your cake, ${worries} ${worries === 1 ? 'note' : 'notes'}`}
      </span>
    </button>
  );
}
