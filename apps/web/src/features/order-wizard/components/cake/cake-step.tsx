import { useWizard } from '../../wizard/wizard-context.ts';
import { SuitableCakes } from '../frame/suitable-cakes.tsx';
import { StepPage } from '../frame/step-page.tsx';
import { CuttingFields } from './cutting-fields.tsx';
import { FeedsMeter } from './feeds-meter.tsx';
import { KindChoice } from './kind-choice.tsx';
import { SheetFields } from './sheet-fields.tsx';
import { TierList } from './tier-list.tsx';

/** What is baked: a proposed stack, a sheet, or the customer's own; then what is inside. */
export function CakeStep() {
  const { values } = useWizard();
  const { cake } = values;
  return (
    <StepPage step="cake">
      <KindChoice />
      <FeedsMeter />
      <SuitableCakes />
      {cake.kind === 'sheet' ? <SheetFields /> : <TierList />}
      <CuttingFields />
    </StepPage>
  );
}
