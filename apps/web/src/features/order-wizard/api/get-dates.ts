import { queryOptions, skipToken } from '@tanstack/react-query';
import { type DatesResponse, datesResponse } from '#shared/contracts/dates.ts';
import type { Design } from '#shared/contracts/design.ts';
import { request } from '#web/lib/http.ts';

/** Some days need longer to decide; they are asked for again this often, so many times. */
const askAgainMs = 1_000;
const askAgainTimes = 5;

type Asked = { readonly data: DatesResponse | undefined; readonly dataUpdateCount: number };

/** `POST /api/dates`: which days of a range this design can be made for. Waits for a design. */
export function datesQuery(design: Design | null, from: string, to: string) {
  return queryOptions({
    queryKey: ['dates', design, from, to],
    queryFn:
      design === null
        ? skipToken
        : ({ signal }) =>
            request({
              method: 'POST',
              path: '/api/dates',
              body: { design, from, to },
              answer: datesResponse,
              signal,
            }),
    staleTime: 60_000,
    refetchInterval: ({ state }) => (stillAsking(state) ? askAgainMs : false),
  });
}

/** Whether any day is still being worked out, and worth asking for again. */
export function stillAsking(asked: Asked | undefined): boolean {
  if (asked === undefined || asked.dataUpdateCount > askAgainTimes) return false;
  return asked.data?.days.some((day) => day.answer === 'checking') ?? false;
}
