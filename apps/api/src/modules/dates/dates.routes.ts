import { datesRequest, datesResponse } from '#shared/contracts/dates.ts';
import { limitByAddress } from '#api/http/rate-limit.ts';
import { createRoutes } from '#api/http/route.ts';
import type { FeatureRoutes } from '#api/http/route.ts';
import type { Deps } from '#api/modules/deps.ts';
import { answerDatesFor } from '#api/modules/plan/plan.queries.ts';

/** Which days a design can be made for: the same for everybody, and nobody's orders are named. */
export function datesRoutes(deps: Pick<Deps, 'clock'>): FeatureRoutes {
  const routes = createRoutes('anonymous');
  routes.add(
    {
      name: 'answer-dates',
      method: 'post',
      path: '/api/dates',
      summary: 'For each day of a range: open, last place, ask us, or closed and why.',
      body: datesRequest,
      response: datesResponse,
      refusals: ['too-many-requests'],
    },
    ({ body }) => answerDatesFor(body.design, body.from, body.to),
    limitByAddress(deps, 'answer-dates'),
  );
  return routes;
}
