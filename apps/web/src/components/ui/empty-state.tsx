import type { ReactNode } from 'react';

/** Nothing here yet: says so, and what to do next. */
export function EmptyState({
  title,
  children,
  action,
}: {
  readonly title: string;
  readonly children?: ReactNode;
  readonly action?: ReactNode;
}) {
  return (
    <div className="grid justify-items-start gap-3 rounded-action bg-cloud px-5 py-6">
      <h2>{title}</h2>
      {children && <div className="measure text-slate">{children}</div>}
      {action}
    </div>
  );
}
