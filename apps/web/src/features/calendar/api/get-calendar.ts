import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { calendarView } from '#shared/contracts/staff.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';

/** The days of a range with their load, the cakes on them, and what waits for an answer. */
export function calendarQuery(from: string, to: string) {
  return queryOptions({
    queryKey: [...staffKeys.calendar, from, to],
    queryFn: ({ signal }) =>
      request({ path: '/api/staff/calendar', query: { from, to }, answer: calendarView, signal }),
    placeholderData: keepPreviousData,
    // Orders come in while the page lies open on the counter.
    refetchInterval: 60_000,
  });
}

export function useCalendar(from: string, to: string) {
  return useQuery(calendarQuery(from, to));
}
