import { Navigate } from 'react-router-dom';
import { paths } from '#web/config/paths.ts';
import { allowedStep } from '../steps/check-step.ts';
import { useWizard } from '../wizard/wizard-context.ts';

/** The order's own address leads to where its draft was left. */
export function ResumeOrder() {
  const { values, reached } = useWizard();
  return <Navigate to={paths.orderStep(allowedStep(reached, values))} replace />;
}
