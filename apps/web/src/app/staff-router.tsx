import { Navigate, Route, Routes } from 'react-router-dom';
import { paths } from '#web/config/paths.ts';
import { lazyPage } from '#web/lib/lazy-page.ts';
import { NotFoundPage } from '#web/routes/not-found-page.tsx';
import { StaffLayout } from './staff-layout.tsx';
import { StudioLayout } from './studio-layout.tsx';

const CalendarPage = lazyPage(
  async () => (await import('#web/routes/staff/calendar-page.tsx')).CalendarPage,
);
const OrdersPage = lazyPage(
  async () => (await import('#web/routes/staff/orders-page.tsx')).OrdersPage,
);
const StaffOrderPage = lazyPage(
  async () => (await import('#web/routes/staff/staff-order-page.tsx')).StaffOrderPage,
);
const SentMailPage = lazyPage(
  async () => (await import('#web/routes/staff/sent-mail-page.tsx')).SentMailPage,
);
const PeoplePage = lazyPage(
  async () => (await import('#web/routes/staff/people-page.tsx')).PeoplePage,
);
const MePage = lazyPage(async () => (await import('#web/routes/staff/me-page.tsx')).MePage);

/** The staff's addresses; loaded apart, so that no customer carries them. */
export function StaffRouter() {
  return (
    <Routes>
      <Route element={<StaffLayout />}>
        <Route index element={<Navigate to={paths.staffCalendar} replace />} />
        <Route path="calendar" element={<CalendarPage />} />
        <Route path="orders" element={<OrdersPage />} />
        <Route path="orders/:number" element={<StaffOrderPage />} />
        <Route path="mail/:id" element={<SentMailPage />} />
        <Route path="studio" element={<StudioLayout />}>
          <Route index element={<PeoplePage />} />
        </Route>
        <Route path="me" element={<MePage />} />
        <Route path="*" element={<NotFoundPage />} />
      </Route>
    </Routes>
  );
}
