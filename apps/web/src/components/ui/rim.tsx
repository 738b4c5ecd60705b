import type { ReactNode } from 'react';
import { classNames } from '#web/lib/class-names.ts';

/** The one main surface of a page: white enamel with its blue rim. One a page. */
export function Rim({
  label,
  className,
  children,
}: {
  readonly label?: string;
  readonly className?: string;
  readonly children: ReactNode;
}) {
  return (
    <section aria-label={label} className={classNames('rim min-w-0', className ?? 'p-5 sm:p-7')}>
      {children}
    </section>
  );
}
