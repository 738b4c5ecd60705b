import { type ReactNode, useId } from 'react';
import { classNames } from '#web/lib/class-names.ts';

type Props = {
  readonly title: ReactNode;
  readonly className?: string;
  readonly children: ReactNode;
};

/** A part of a page under its own heading. */
export function Section({ title, className, children }: Props) {
  const id = useId();
  return (
    <section
      aria-labelledby={id}
      className={classNames('grid min-w-0 content-start gap-4', className)}
    >
      <h2 id={id}>{title}</h2>
      {children}
    </section>
  );
}
