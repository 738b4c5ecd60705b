import { openPrivateLink as openPrivateLinkBody } from '#shared/contracts/orders.ts';
import { done, itIsDone } from '#shared/contracts/common.ts';
import { limitByAddress } from '#api/http/rate-limit.ts';
import { createRoutes, type FeatureRoutes } from '#api/http/route.ts';
import { grantOrder } from '#api/http/session.ts';
import type { Deps } from '#api/modules/deps.ts';
import { openPrivateLink } from '#api/modules/orders/open-private-link.command.ts';

/** An order's private link: its key, for a cookie good for that order. */
export function orderAccessRoutes(deps: Deps): FeatureRoutes {
  const routes = createRoutes();
  routes.add(
    {
      name: 'open-private-link',
      method: 'post',
      path: '/api/order-access',
      summary: 'Open an order by its private link; keeps its place longer, the first time.',
      body: openPrivateLinkBody,
      response: done,
    },
    async ({ body, request }) => {
      await grantOrder(request, await openPrivateLink(deps, body));
      return itIsDone;
    },
    limitByAddress(deps, 'open-private-link'),
  );
  return routes;
}
