import { type ReactNode, createContext, useContext } from 'react';

const SiteNameContext = createContext('');

/** The studio's name, for everything that carries it; empty until it is known. */
export function useSiteName(): string {
  return useContext(SiteNameContext);
}

export function SiteName({
  name,
  children,
}: {
  readonly name: string;
  readonly children: ReactNode;
}) {
  return <SiteNameContext value={name}>{children}</SiteNameContext>;
}
