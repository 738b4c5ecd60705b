import type { ReactNode } from 'react';
import { Link, NavLink } from 'react-router-dom';
import type { StudioCard } from '#shared/contracts/menu.ts';
import { SiteHeader } from '#web/components/ui/site-header.tsx';
import { SiteName } from '#web/components/ui/site-name.tsx';
import { SkipLink } from '#web/components/ui/skip-link.tsx';
import { paths } from '#web/config/paths.ts';
import { useMenuQuery } from '#web/features/menu/api/get-menu.ts';
import { useSession } from '#web/features/session/api/get-session.ts';
import { classNames } from '#web/lib/class-names.ts';
import { ConnectionNotice } from './connection-notice.tsx';
import { PageFrame } from './page-frame.tsx';

/** The frame of the public pages: they carry the studio's name. */
export function PublicLayout() {
  const studio = useMenuQuery().data?.studio ?? null;
  return (
    <SiteName name={studio?.name ?? ''}>
      <SkipLink />
      <div className="flex min-h-dvh flex-col">
        <SiteHeader name={studio?.name ?? ''} homeTo={paths.home} nav={<Places />}>
          <ConnectionNotice />
          <PageFrame />
        </SiteHeader>
        <PublicFooter studio={studio} />
      </div>
    </SiteName>
  );
}

function Places() {
  const user = useSession().data?.user ?? null;
  return (
    <nav aria-label="Places" className="contents">
      <div className="ml-auto max-[23rem]:-mx-2">
        <Place to={paths.order}>Order a cake</Place>
      </div>
      <div className="-mx-2 -mt-1.5 flex w-[calc(100%+1rem)] flex-wrap gap-x-1 sm:m-0 sm:w-auto sm:gap-x-3">
        <Place to={paths.menu}>Menu</Place>
        <Place to={paths.care}>Care and allergens</Place>
        {user === null && <Place to={paths.signIn}>Sign in</Place>}
        {user?.role === 'customer' && <Place to={paths.account}>My account</Place>}
        {user !== null && user.role !== 'customer' && <Place to={paths.staff}>To the studio</Place>}
      </div>
    </nav>
  );
}

function Place({ to, children }: { readonly to: string; readonly children: ReactNode }) {
  return (
    <NavLink
      to={to}
      className={({ isActive }) =>
        classNames(
          'inline-flex min-h-11 items-center rounded-mark border-b-3 px-2 font-semibold',
          isActive ? 'border-butter text-ink' : 'border-transparent text-cobalt hover:border-seam',
        )
      }
    >
      {children}
    </NavLink>
  );
}

function PublicFooter({ studio }: { readonly studio: StudioCard | null }) {
  return (
    <footer data-print="no" className="mt-16 border-t border-seam bg-cloud">
      <div className="page flex flex-wrap justify-between gap-x-10 gap-y-5 py-8 text-slate">
        {studio && (
          <address className="not-italic">
            <p className="font-semibold text-ink">{studio.name}</p>
            <p>
              {studio.street}, {studio.town}
              {studio.region !== '' && `, ${studio.region}`} {studio.postcode}
            </p>
            <p className="flex flex-wrap gap-x-6">
              <a
                href={`tel:${studio.phone.replaceAll(/[^+\d]/g, '')}`}
                className="link inline-block py-1"
              >
                {studio.phone}
              </a>
              <a href={`mailto:${studio.email}`} className="link inline-block py-1">
                {studio.email}
              </a>
            </p>
          </address>
        )}
        <div className="flex flex-wrap items-end gap-x-5 gap-y-1 text-sm">
          <Link to={paths.policies} className="link inline-block py-1">
            Policies and privacy
          </Link>
          <Link to={paths.staffSignIn} className="link inline-block py-1">
            Studio sign-in
          </Link>
          <span className="py-1">Kept with Tierwell</span>
        </div>
      </div>
    </footer>
  );
}
