import { estimate, estimateRequest } from '#shared/contracts/estimates.ts';
import { createRoutes } from '#api/http/route.ts';
import type { FeatureRoutes } from '#api/http/route.ts';
import type { Deps } from '#api/modules/deps.ts';
import { preparedMenu } from '#api/modules/menu/menu.queries.ts';
import { estimateDesign } from './estimate-design.queries.ts';

/** Estimates bind nobody and are the same for everybody. */
export function estimatesRoutes({ clock }: Deps): FeatureRoutes {
  const routes = createRoutes('anonymous');
  routes.add(
    {
      name: 'estimate-design',
      method: 'post',
      path: '/api/estimates',
      summary: 'Portions, price, allergens, advice and amounts of a design.',
      body: estimateRequest,
      response: estimate,
    },
    async ({ body }) => {
      const { menu } = await preparedMenu();
      return estimateDesign(body, {
        menu,
        now: clock.now(),
        fieldOf: (path) => ['design', ...path],
      });
    },
  );
  return routes;
}
