import { useQueryClient } from '@tanstack/react-query';
import { type ReactNode, useEffect } from 'react';
import { Link, NavLink, Navigate, useLocation } from 'react-router-dom';
import type { SessionView } from '#shared/contracts/accounts.ts';
import { Failure } from '#web/components/ui/failure.tsx';
import { LinkButton } from '#web/components/ui/link-button.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { SiteHeader } from '#web/components/ui/site-header.tsx';
import { SiteName } from '#web/components/ui/site-name.tsx';
import { SkipLink, mainId } from '#web/components/ui/skip-link.tsx';
import { TierwellMark } from '#web/components/ui/tierwell-mark.tsx';
import { paths } from '#web/config/paths.ts';
import { useMenuQuery } from '#web/features/menu/api/get-menu.ts';
import { sessionQuery, useSession } from '#web/features/session/api/get-session.ts';
import { classNames } from '#web/lib/class-names.ts';
import { ApiProblem } from '#web/lib/http.ts';
import { ConnectionNotice } from './connection-notice.tsx';
import { PageFrame, PagePending } from './page-frame.tsx';

type User = NonNullable<SessionView['user']>;

/** The frame of the staff's side: the mark, the places there are, and who is signed in. */
export function StaffLayout() {
  const studio = useMenuQuery().data?.studio ?? null;
  const session = useSession();
  const user = session.data?.user ?? null;
  useSignedOutWatch();
  return (
    <SiteName name={studio?.name ?? ''}>
      <SkipLink />
      <div className="flex min-h-dvh flex-col [--page-max:100rem]">
        <SiteHeader
          name={studio?.name ?? ''}
          homeTo={paths.staffCalendar}
          mark={<TierwellMark />}
          nav={user !== null && user.role !== 'customer' ? <StaffPlaces user={user} /> : null}
        >
          <ConnectionNotice />
          {session.isPending ? (
            <main id={mainId} tabIndex={-1}>
              <PagePending />
            </main>
          ) : session.isError ? (
            <main id={mainId} tabIndex={-1} className="page grid gap-5 py-10">
              <PageTitle title="Not just now" />
              <Failure error={session.error} onRetry={() => void session.refetch()} />
            </main>
          ) : (
            <StaffDoor user={user} />
          )}
        </SiteHeader>
      </div>
    </SiteName>
  );
}

/** Lets the staff in; sends everybody else to where they can sign in, or says why not. */
function StaffDoor({ user }: { readonly user: User | null }) {
  const { pathname, search } = useLocation();
  const next = `?next=${encodeURIComponent(pathname + search)}`;
  if (user === null) return <Navigate to={paths.staffSignIn + next} replace />;
  if (user.role === 'customer') return <NotStaff />;
  if (user.secondFactor === 'needed' || user.secondFactor === 'to-enrol') {
    return <Navigate to={paths.secondFactor + next} replace />;
  }
  return <PageFrame />;
}

function NotStaff() {
  return (
    <main id={mainId} tabIndex={-1} className="page grid justify-items-start gap-5 py-10">
      <PageTitle title="This side is the studio’s" />
      <p className="measure">
        You are signed in as a customer. Your own orders are in your account; people who work here
        sign in with the studio’s address.
      </p>
      <div className="flex flex-wrap gap-3">
        <LinkButton to={paths.account}>To my account</LinkButton>
        <LinkButton to={paths.staffSignIn} kind="secondary">
          Studio sign-in
        </LinkButton>
      </div>
    </main>
  );
}

/** A session that ran out shows at the next request: whoever it was is asked to sign in again. */
function useSignedOutWatch(): void {
  const client = useQueryClient();
  useEffect(() => {
    const look = (error: unknown) => {
      if (!(error instanceof ApiProblem)) return;
      if (error.code !== 'not-signed-in' && error.code !== 'second-factor-needed') return;
      void client.invalidateQueries({ queryKey: sessionQuery().queryKey });
    };
    const stopQueries = client.getQueryCache().subscribe((event) => {
      if (event.type === 'updated' && event.action.type === 'error') look(event.action.error);
    });
    const stopMutations = client.getMutationCache().subscribe((event) => {
      if (event.type === 'updated' && event.action.type === 'error') look(event.action.error);
    });
    return () => {
      stopQueries();
      stopMutations();
    };
  }, [client]);
}

function StaffPlaces({ user }: { readonly user: User }) {
  return (
    <>
      <nav aria-label="Places" className="-mx-2 flex sm:mx-0 sm:gap-x-3">
        <Place to={paths.staffOrders}>Orders</Place>
        <Place to={paths.staffCalendar}>Calendar</Place>
        {user.role !== 'counter' && <Place to={paths.staffPantry}>Pantry</Place>}
        {user.role === 'owner' && <Place to={paths.staffPeople}>Studio</Place>}
      </nav>
      <Link
        to={paths.staffMe}
        className="link ml-auto inline-flex min-h-11 items-center text-sm font-normal"
      >
        {user.name}
        <span className="hidden sm:inline">, {user.role}</span>
      </Link>
    </>
  );
}

function Place({ to, children }: { readonly to: string; readonly children: ReactNode }) {
  return (
    <NavLink
      to={to}
      className={({ isActive }) =>
        classNames(
          'inline-flex min-h-11 items-center rounded-mark border-b-3 px-2 font-semibold',
          isActive ? 'border-butter text-ink' : 'border-transparent text-slate hover:border-seam',
        )
      }
    >
      {children}
    </NavLink>
  );
}
