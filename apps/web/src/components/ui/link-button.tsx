import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { classNames } from '#web/lib/class-names.ts';
import { actionClasses, type ButtonKind, type ButtonSize } from './button.tsx';

type Props = {
  readonly to: string;
  readonly kind?: ButtonKind;
  readonly size?: ButtonSize;
  readonly wide?: boolean;
  readonly className?: string;
  /** A full load from the server (a file, another service), not a page of the app. */
  readonly external?: boolean;
  readonly children: ReactNode;
};

/** A link that stands where an action would: it goes somewhere. */
export function LinkButton({
  to,
  kind = 'primary',
  size = 'normal',
  wide = false,
  className,
  external = false,
  children,
}: Props) {
  const classes = classNames(actionClasses(kind, size, wide), className);
  return external ? (
    <a href={to} className={classes}>
      {children}
    </a>
  ) : (
    <Link to={to} className={classes}>
      {children}
    </Link>
  );
}
