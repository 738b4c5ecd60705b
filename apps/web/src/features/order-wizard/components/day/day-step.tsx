import { StepPage } from '../frame/step-page.tsx';
import { AllergyFields } from './allergy-fields.tsx';
import { DateFields } from './date-fields.tsx';
import { GuestFields } from './guest-fields.tsx';

/** Who eats, what they must keep from, and when: asked before anything is designed. */
export function DayStep() {
  return (
    <StepPage step="day">
      <GuestFields />
      <AllergyFields />
      <DateFields />
    </StepPage>
  );
}
