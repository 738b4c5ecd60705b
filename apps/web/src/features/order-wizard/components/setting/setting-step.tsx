import { SuitableCakes } from '../frame/suitable-cakes.tsx';
import { StepPage } from '../frame/step-page.tsx';
import { CoatChoice } from './coat-choice.tsx';
import { SettingFields } from './setting-fields.tsx';
import { TierCoats } from './tier-coats.tsx';

/** Where the cake will stand, and what goes over it, ranked for that. */
export function SettingStep() {
  return (
    <StepPage step="setting">
      <SettingFields />
      <SuitableCakes />
      <CoatChoice />
      <TierCoats />
    </StepPage>
  );
}
