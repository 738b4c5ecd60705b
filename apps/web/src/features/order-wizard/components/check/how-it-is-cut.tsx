import { Suspense, lazy } from 'react';
import type { Design } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { Fold } from '#web/components/ui/fold.tsx';
import { Pending } from '#web/components/ui/pending.tsx';

type Props = { readonly design: Design; readonly menu: Menu; readonly portions: number };

// Few look at it before the cake is there, so it comes in a chunk of its own.
const CuttingPlan = lazy(async () => ({
  default: (await import('#web/components/cutting-plan/cutting-plan.tsx')).CuttingPlan,
}));

/** How the portions are counted: the cake from above with every cut, for those who want to see it. */
export function HowItIsCut({ design, menu, portions }: Props) {
  return (
    <Fold label={`How it is cut into ${portions} portions`}>
      <Suspense fallback={<Pending what="Drawing the cuts…" />}>
        <CuttingPlan design={design} menu={menu} />
      </Suspense>
    </Fold>
  );
}
