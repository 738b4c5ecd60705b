import type { ReactNode } from 'react';

/** The foot of a dialog: its actions stay in sight while the rest scrolls. */
export function DialogActions({ children }: { readonly children: ReactNode }) {
  return (
    <div className="sticky bottom-0 -mx-5 -mb-5 flex flex-wrap items-center gap-x-3 gap-y-2 border-t border-seam bg-enamel px-5 py-4 sm:-mx-7 sm:-mb-7 sm:px-7">
      {children}
    </div>
  );
}
