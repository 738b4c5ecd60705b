import { Suspense } from 'react';
import { Route, Routes } from 'react-router-dom';
import { paths } from '#web/config/paths.ts';
import { lazyPage } from '#web/lib/lazy-page.ts';
import { NotFoundPage } from '#web/routes/not-found-page.tsx';
import { PagePending } from './page-frame.tsx';
import { PublicLayout } from './public-layout.tsx';
import { ScrollToTop } from './scroll-to-top.tsx';

const HomePage = lazyPage(async () => (await import('#web/routes/home/home-page.tsx')).HomePage);
const MenuPage = lazyPage(async () => (await import('#web/routes/menu/menu-page.tsx')).MenuPage);
const CarePage = lazyPage(async () => (await import('#web/routes/care/care-page.tsx')).CarePage);
const CakePage = lazyPage(async () => (await import('#web/routes/cake/cake-page.tsx')).CakePage);
const PoliciesPage = lazyPage(
  async () => (await import('#web/routes/policies/policies-page.tsx')).PoliciesPage,
);
const OrderRoutes = lazyPage(
  async () => (await import('#web/routes/order/order-routes.tsx')).OrderRoutes,
);
const MyOrderPage = lazyPage(
  async () => (await import('#web/routes/orders/my-order-page.tsx')).MyOrderPage,
);
const AccountPage = lazyPage(
  async () => (await import('#web/routes/account/account-page.tsx')).AccountPage,
);
const SignInPage = lazyPage(
  async () => (await import('#web/routes/sign-in/sign-in-page.tsx')).SignInPage,
);
const StaffSignInPage = lazyPage(
  async () => (await import('#web/routes/sign-in/staff-sign-in-page.tsx')).StaffSignInPage,
);
const SecondFactorPage = lazyPage(
  async () => (await import('#web/routes/sign-in/second-factor-page.tsx')).SecondFactorPage,
);
const ForgottenPasswordPage = lazyPage(
  async () =>
    (await import('#web/routes/sign-in/forgotten-password-page.tsx')).ForgottenPasswordPage,
);
const StaffRouter = lazyPage(async () => (await import('./staff-router.tsx')).StaffRouter);
const LinkPage = lazyPage(async () => (await import('#web/routes/sign-in/link-page.tsx')).LinkPage);

/** Every address and its page; each page loads apart, the staff's with their own frame. */
export function AppRouter() {
  return (
    <>
      <ScrollToTop />
      <Routes>
        <Route
          path={`${paths.staff}/*`}
          element={
            <Suspense fallback={<PagePending />}>
              <StaffRouter />
            </Suspense>
          }
        />
        <Route element={<PublicLayout />}>
          <Route path={paths.home} element={<HomePage />} />
          <Route path={paths.menu} element={<MenuPage />} />
          <Route path={paths.care} element={<CarePage />} />
          <Route path="/cake/:code" element={<CakePage />} />
          <Route path={paths.policies} element={<PoliciesPage />} />
          <Route path={`${paths.order}/*`} element={<OrderRoutes />} />
          <Route path="/orders/:code" element={<MyOrderPage />} />
          <Route path={paths.account} element={<AccountPage />} />
          <Route path={paths.signIn} element={<SignInPage />} />
          <Route path={paths.staffSignIn} element={<StaffSignInPage />} />
          <Route path={paths.secondFactor} element={<SecondFactorPage />} />
          <Route path={paths.forgottenPassword} element={<ForgottenPasswordPage />} />
          <Route path="/links/:purpose" element={<LinkPage />} />
          <Route path="*" element={<NotFoundPage />} />
        </Route>
      </Routes>
    </>
  );
}
