import type { ReactNode } from 'react';

/** A page's title with what can be done beside it. */
export function TitleRow({
  title,
  children,
}: {
  readonly title: ReactNode;
  readonly children?: ReactNode;
}) {
  return (
    <div className="flex flex-wrap items-center justify-between gap-x-6 gap-y-3">
      {title}
      <div data-print="no" className="flex flex-wrap items-center gap-2">
        {children}
      </div>
    </div>
  );
}
