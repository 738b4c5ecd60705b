import { useParams } from 'react-router-dom';
import { OrderWizard } from '#web/features/order-wizard/components/order-wizard.tsx';
import { isOrderStep } from '#web/features/order-wizard/steps/steps.ts';
import { useSession } from '#web/features/session/api/get-session.ts';
import { NotFoundPage } from '../not-found-page.tsx';

/** One step of the order, by its address. */
export function OrderStepPage() {
  const { step } = useParams();
  const user = useSession().data?.user ?? null;
  if (!isOrderStep(step)) return <NotFoundPage />;
  return <OrderWizard step={step} signedInAs={user?.name ?? null} />;
}
