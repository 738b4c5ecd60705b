import { useQuery, useQueryClient } from '@tanstack/react-query';
import type { DayAnswer } from '#shared/contracts/dates.ts';
import type { Design } from '#shared/contracts/design.ts';
import type { LocalDate } from '#shared/dates/local-time.ts';
import { datesQuery, stillAsking } from '../api/get-dates.ts';

export type Dates = {
  readonly days: ReadonlyMap<LocalDate, DayAnswer>;
  readonly likely: boolean;
  readonly firstOpen: LocalDate | null;
  readonly pending: boolean;
  readonly error: unknown;
  readonly retry: () => void;
};

/**
 * The days of a range for a design. Days the server is still working out are asked for again for a
 * few seconds; what is undecided then is "ask us".
 */
export function useDates(design: Design | null, from: LocalDate, to: LocalDate): Dates {
  const client = useQueryClient();
  const options = datesQuery(design, from, to);
  const { data, error, isPending, isFetching, refetch } = useQuery(options);
  const asking = isFetching || stillAsking(client.getQueryState(options.queryKey));
  const days = new Map<LocalDate, DayAnswer>();
  for (const day of data?.days ?? []) {
    const undecided = day.answer === 'checking' && !asking;
    days.set(day.date, undecided ? { ...day, answer: 'ask-us' } : day);
  }
  return {
    days,
    likely: data?.likely ?? true,
    firstOpen: data?.firstOpen ?? null,
    pending: isPending && design !== null,
    error,
    retry: () => void refetch(),
  };
}
