import { Route, Routes } from 'react-router-dom';
import { ResumeOrder } from '#web/features/order-wizard/components/resume-order.tsx';
import { lazyPage } from '#web/lib/lazy-page.ts';
import { OrderLayout } from './order-layout.tsx';
import { OrderStepPage } from './order-step-page.tsx';

const SentPage = lazyPage(async () => (await import('./sent-page.tsx')).SentPage);

/** The pages of ordering: six steps over one draft, and the one after sending. */
export function OrderRoutes() {
  return (
    <Routes>
      <Route path="sent" element={<SentPage />} />
      <Route element={<OrderLayout />}>
        <Route index element={<ResumeOrder />} />
        <Route path=":step" element={<OrderStepPage />} />
      </Route>
    </Routes>
  );
}
