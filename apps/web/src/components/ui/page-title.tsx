import { type ReactNode, useEffect, useRef, useState } from 'react';
import { useLocation } from 'react-router-dom';
import { useSiteName } from './site-name.tsx';

type Props = {
  /** For the browser's tab, before the studio's name. */
  readonly title: string;
  /** The heading, where it is more than the title. */
  readonly children?: ReactNode;
  readonly className?: string;
};

/**
 * The page's one h1. Names the browser's tab, and takes the focus when the visitor came here from
 * another page of the app, so that a screen reader says where they are.
 */
export function PageTitle({ title, children, className }: Props) {
  const heading = useRef<HTMLHeadingElement>(null);
  const site = useSiteName();
  const { key, pathname } = useLocation();
  // The first page of a visit keeps the browser's own starting point.
  const [first] = useState({ pathname, arrived: key !== 'default' });

  useEffect(() => {
    document.title = site === '' ? title : `${title} · ${site}`;
  }, [title, site]);

  useEffect(() => {
    if (first.arrived || pathname !== first.pathname) {
      heading.current?.focus({ preventScroll: true });
    }
    // A new page is a new path; a changed query or fragment on the same page is not.
  }, [pathname, first]);

  return (
    <h1 ref={heading} tabIndex={-1} className={className}>
      {children ?? title}
    </h1>
  );
}
