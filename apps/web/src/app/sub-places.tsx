import { NavLink } from 'react-router-dom';
import { classNames } from '#web/lib/class-names.ts';

type Props = {
  /** The place these are parts of. */
  readonly label: string;
  /** `end`: shown as current at its own address alone, not at those under it. */
  readonly places: readonly {
    readonly to: string;
    readonly name: string;
    readonly end?: boolean;
  }[];
};

/** The places within one of the staff's places, above each of its pages. */
export function SubPlaces({ label, places }: Props) {
  return (
    <nav aria-label={label} data-print="no" className="border-b border-seam bg-cloud print:hidden">
      <ul className="page flex flex-wrap gap-x-1">
        {places.map(({ to, name, end = false }) => (
          <li key={to}>
            <NavLink
              to={to}
              end={end}
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
  );
}
