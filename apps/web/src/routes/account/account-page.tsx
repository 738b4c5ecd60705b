import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Navigate, useNavigate } from 'react-router-dom';
import { Button } from '#web/components/ui/button.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { paths } from '#web/config/paths.ts';
import { accountQuery } from '#web/features/account/api/get-account.ts';
import { OwnData } from '#web/features/account/components/own-data.tsx';
import { OwnOrders } from '#web/features/account/components/own-orders.tsx';
import { SessionList } from '#web/features/account/components/session-list.tsx';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { orderWords } from '#web/features/my-order/order-words.ts';
import { useSession } from '#web/features/session/api/get-session.ts';
import { useSignOut } from '#web/features/session/api/sign-out.ts';
import { GoogleButton } from '#web/features/session/components/google-button.tsx';

/** A customer's own account: orders, signing in, data. */
export function AccountPage() {
  const { data, isPending, error, refetch } = useSession();
  if (isPending) {
    return (
      <div className="page">
        <Pending what="One moment…" />
      </div>
    );
  }
  if (error) {
    return (
      <div className="page grid gap-5 py-8">
        <PageTitle title="My account" />
        <Failure error={error} onRetry={() => void refetch()} />
      </div>
    );
  }
  if (data.user === null) return <Navigate to={paths.signInThen(paths.account)} replace />;
  // Staff have no orders of their own; how they sign in is kept on their side.
  if (data.user.role !== 'customer') return <Navigate to={paths.staffMe} replace />;
  return <CustomerAccount />;
}

function CustomerAccount() {
  const { locale } = useMenu().studio;
  const account = useQuery(accountQuery());
  return (
    <AccountFrame email={account.data?.email ?? ''}>
      {account.isPending && <Pending what="Looking up your orders…" />}
      {account.error && <Failure error={account.error} onRetry={() => void account.refetch()} />}
      {account.data && (
        <>
          <Section title="My orders">
            <Rim className="p-3 sm:p-5">
              <OwnOrders
                orders={account.data.orders}
                locale={locale}
                wordOf={(it) => orderWords[it]}
              />
            </Rim>
          </Section>
          <Section title="Signing in">
            {account.data.google ? (
              <p>Your Google account is joined to this one.</p>
            ) : (
              <div>
                <GoogleButton next={paths.account} link />
              </div>
            )}
            <SessionList locale={locale} />
          </Section>
          <Section title="What we keep about you">
            <OwnData email={account.data.email} />
          </Section>
        </>
      )}
    </AccountFrame>
  );
}

function AccountFrame({
  email,
  children,
}: {
  readonly email: string;
  readonly children: ReactNode;
}) {
  const navigate = useNavigate();
  const signOut = useSignOut();
  return (
    <div className="page grid gap-10 py-8">
      <header className="flex flex-wrap items-end justify-between gap-4">
        <div className="grid gap-1">
          <PageTitle title="My account" />
          <p className="text-slate">{email}</p>
        </div>
        <Button
          kind="secondary"
          pending={signOut.isPending}
          onClick={() => signOut.mutate(undefined, { onSuccess: () => void navigate(paths.home) })}
        >
          Sign out
        </Button>
      </header>
      {signOut.isError && <Failure error={signOut.error} />}
      {children}
    </div>
  );
}
