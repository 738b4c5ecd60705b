import { Route, Routes } from 'react-router-dom';
import { NotFoundPage } from '#web/routes/not-found-page.tsx';
import { PublicLayout } from './public-layout.tsx';
import { ScrollToTop } from './scroll-to-top.tsx';

/** Every address and its page; each page loads apart, the staff's with their own frame. */
export function AppRouter() {
  return (
    <>
      <ScrollToTop />
      <Routes>
        <Route element={<PublicLayout />}>
          <Route path="*" element={<NotFoundPage />} />
        </Route>
      </Routes>
    </>
  );
}
