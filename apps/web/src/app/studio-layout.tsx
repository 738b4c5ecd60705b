import { Suspense } from 'react';
import { NavLink, Outlet } from 'react-router-dom';
import { paths } from '#web/config/paths.ts';
import { classNames } from '#web/lib/class-names.ts';
import { PagePending } from './page-frame.tsx';

/** What the owner looks after, in the order it is looked for. */
const places = [{ to: paths.staffPeople, name: 'People' }] as const;

/** The Studio's own places, above each of its pages. */
export function StudioLayout() {
  return (
    <>
      <nav
        aria-label="Studio"
        data-print="no"
        className="border-b border-seam bg-cloud print:hidden"
      >
        <ul className="page flex flex-wrap gap-x-1">
          {places.map(({ to, name }) => (
            <li key={to}>
              <NavLink
                to={to}
                end
                className={({ isActive }) =>
                  classNames(
                    '-mb-px inline-flex min-h-11 items-center border-b-2 px-3 text-sm font-semibold',
                    isActive
                      ? 'border-cobalt text-ink'
                      : 'border-transparent text-slate hover:text-ink',
                  )
                }
              >
                {name}
              </NavLink>
            </li>
          ))}
        </ul>
      </nav>
      <Suspense fallback={<PagePending />}>
        <Outlet />
      </Suspense>
    </>
  );
}
