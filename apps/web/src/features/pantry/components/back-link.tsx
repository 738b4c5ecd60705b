import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';

/** The way back to the list a page belongs to. */
export function BackLink({ to, children }: { readonly to: string; readonly children: ReactNode }) {
  return (
    <Link
      to={to}
      data-print="no"
      className="link -mb-3 inline-flex min-h-9 w-fit items-center gap-1.5 text-sm"
    >
      <svg viewBox="0 0 12 12" className="w-3" aria-hidden="true">
        <path
          d="M8 1.5L3.5 6 8 10.5"
          fill="none"
          stroke="currentColor"
          strokeWidth="2"
          strokeLinecap="round"
          strokeLinejoin="round"
        />
      </svg>
      {children}
    </Link>
  );
}
