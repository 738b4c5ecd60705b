import { Outlet } from 'react-router-dom';
import { Failure } from '#web/components/ui/failure.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { useMenuQuery } from '#web/features/menu/api/get-menu.ts';
import { WizardProvider } from '#web/features/order-wizard/wizard/wizard-provider.tsx';
import { useSession } from '#web/features/session/api/get-session.ts';

/** Gives every step the menu, whoever is signed in, and the one draft. */
export function OrderLayout() {
  const menu = useMenuQuery();
  const session = useSession();
  if (menu.data === undefined) {
    return (
      <div className="page grid gap-6 py-8">
        <PageTitle title="Order a cake" />
        {menu.isError ? (
          <Failure error={menu.error} onRetry={() => void menu.refetch()} />
        ) : (
          <Pending what="Fetching the menu…" />
        )}
      </div>
    );
  }
  const user = session.data?.user ?? null;
  const customer = user?.role === 'customer' ? { name: user.name, email: user.email } : null;
  return (
    <WizardProvider menu={menu.data} customer={customer}>
      <Outlet />
    </WizardProvider>
  );
}
