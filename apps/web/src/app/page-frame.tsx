import { Suspense } from 'react';
import { Outlet } from 'react-router-dom';
import { Pending } from '#web/components/ui/pending.tsx';
import { mainId } from '#web/components/ui/skip-link.tsx';
import { PageBoundary } from './error-boundary.tsx';

/** Where the page itself goes: it may be loading, and it may fail without taking the frame along. */
export function PageFrame() {
  return (
    <main id={mainId} tabIndex={-1} className="flex-1">
      <PageBoundary>
        <Suspense fallback={<PagePending />}>
          <Outlet />
        </Suspense>
      </PageBoundary>
    </main>
  );
}

export function PagePending() {
  return (
    <div className="page">
      <Pending what="One moment…" />
    </div>
  );
}
