import type { QueryClient } from '@tanstack/react-query';
import type { SessionView } from '#shared/contracts/accounts.ts';
import { sessionQuery } from './api/get-session.ts';

/** Takes over who is signed in; what was seen as somebody else is forgotten, the menu stays. */
export function enterSession(client: QueryClient, session: SessionView): void {
  client.removeQueries({
    predicate: ({ queryKey: [kind] }) => kind !== 'menu' && kind !== 'session',
  });
  client.setQueryData(sessionQuery().queryKey, session);
}
