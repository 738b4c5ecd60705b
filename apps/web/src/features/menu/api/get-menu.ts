import { queryOptions, useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { menu } from '#shared/contracts/menu.ts';
import { request } from '#web/lib/http.ts';

/** The menu is the same for everyone and changes rarely; the server answers 304 when it has not. */
export function menuQuery() {
  return queryOptions({
    queryKey: ['menu'],
    queryFn: ({ signal }) => request({ path: '/api/menu', answer: menu, signal }),
    staleTime: 5 * 60_000,
  });
}

/** The menu with its pending and error states, for the frame around the pages. */
export function useMenuQuery() {
  return useQuery(menuQuery());
}

/** The menu itself: the page waits for it, and a failure goes to the frame, which offers to try again. */
export function useMenu() {
  return useSuspenseQuery(menuQuery()).data;
}
