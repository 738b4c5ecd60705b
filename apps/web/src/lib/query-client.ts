import { QueryClient } from '@tanstack/react-query';

/**
 * Requests are not retried behind the customer's back: a failure is shown at once with a way to
 * try again, and a query asks again by itself when the connection returns.
 */
export function makeQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: { retry: false, staleTime: 30_000 },
      // Without this a mutation made offline waits silently instead of saying so.
      mutations: { retry: false, networkMode: 'always' },
    },
  });
}
