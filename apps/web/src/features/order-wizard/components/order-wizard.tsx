import { type ComponentType, type LazyExoticComponent, Suspense, lazy, useState } from 'react';
import { Navigate } from 'react-router-dom';
import { Pending } from '#web/components/ui/pending.tsx';
import { paths, type OrderStep } from '#web/config/paths.ts';
import { allowedStep } from '../steps/check-step.ts';
import { missing } from '../steps/use-step.ts';
import { useWizard } from '../wizard/wizard-context.ts';
import { DayStep } from './day/day-step.tsx';
import { OrderHeader } from './frame/order-header.tsx';
import { OtherPageNotice } from './frame/other-page-notice.tsx';
import { Ruler } from './frame/ruler.tsx';
import { SidePanel } from './frame/side-panel.tsx';

const loadCake = async () => ({ default: (await import('./cake/cake-step.tsx')).CakeStep });
const loadSetting = async () => ({
  default: (await import('./setting/setting-step.tsx')).SettingStep,
});
const loadLook = async () => ({ default: (await import('./look/look-step.tsx')).LookStep });
const loadYou = async () => ({ default: (await import('./you/you-step.tsx')).YouStep });
const loadCheck = async () => ({ default: (await import('./check/check-step.tsx')).CheckStep });

/** The first step comes with the page; each other one loads when it is reached. */
const stepPages: Readonly<Record<OrderStep, ComponentType | LazyExoticComponent<ComponentType>>> = {
  day: DayStep,
  cake: lazy(loadCake),
  setting: lazy(loadSetting),
  look: lazy(loadLook),
  you: lazy(loadYou),
  check: lazy(loadCheck),
};

type Props = {
  readonly step: OrderStep;
  /** The name of whoever is signed in. */
  readonly signedInAs: string | null;
};

/** One step in its frame: the ruler above, the cake beside it or at the foot of the screen. */
export function OrderWizard({ step, signedInAs }: Props) {
  return (
    <>
      <OrderHeader step={step} signedInAs={signedInAs} />
      <Ruler step={step} />
      <OtherPageNotice />
      <div className="page grid gap-x-12 pt-6 lg:grid-cols-[minmax(22rem,5fr)_8fr] lg:pt-8">
        <div className="min-w-0 max-w-3xl">
          <StepGuard key={step} step={step} />
        </div>
        <SidePanel step={step} />
      </div>
    </>
  );
}

/** Nothing may be skipped: an address further on leads to what is still missing. */
function StepGuard({ step }: { readonly step: OrderStep }) {
  const { values } = useWizard();
  const [allowed] = useState(() => allowedStep(step, values));
  if (allowed !== step) return <Navigate to={paths.orderStep(allowed)} replace state={missing} />;
  const Page = stepPages[step];
  return (
    <Suspense fallback={<Pending what="One moment…" />}>
      <Page />
    </Suspense>
  );
}
