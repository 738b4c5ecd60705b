import { StepPage } from '../frame/step-page.tsx';
import { ConsentFields } from './consent-fields.tsx';
import { ContactFields } from './contact-fields.tsx';

/** Who orders, who collects, and what they agree to. */
export function YouStep() {
  return (
    <StepPage step="you">
      <ContactFields />
      <ConsentFields />
    </StepPage>
  );
}
