import {
  kitchenSettings,
  saveKitchenRules as saveKitchenRulesBody,
} from '#shared/contracts/kitchen-rules.ts';
import { createRoutes } from '#api/http/route.ts';
import type { FeatureRoutes } from '#api/http/route.ts';
import { authorise, requireStaff } from '#api/modules/authorise.ts';
import type { Deps } from '#api/modules/deps.ts';
import { mayKitchenRules } from './kitchen-rules.policy.ts';
import { loadKitchenRules } from './kitchen-rules.queries.ts';
import { saveKitchenRules } from './save-kitchen-rules.command.ts';

/** The figures that amounts, proposals, supports and advice go by. */
export function kitchenRulesRoutes(_deps: Deps): FeatureRoutes {
  const routes = createRoutes();

  routes.add(
    {
      name: 'see-kitchen-rules',
      method: 'get',
      path: '/api/staff/kitchen-rules',
      summary: 'The figures the kitchen goes by, with the studio’s altitude and warmest hours.',
      response: kitchenSettings,
    },
    ({ actor }) => {
      authorise(actor, mayKitchenRules(actor, 'see-kitchen-rules'));
      return loadKitchenRules();
    },
  );

  routes.add(
    {
      name: 'save-kitchen-rules',
      method: 'put',
      path: '/api/staff/kitchen-rules',
      summary: 'Put other figures in their place; menu, estimates and planner go by them at once.',
      body: saveKitchenRulesBody,
      response: kitchenSettings,
      refusals: ['changed-meanwhile'],
    },
    async ({ actor, body }) => {
      authorise(actor, mayKitchenRules(actor, 'save-kitchen-rules'));
      await saveKitchenRules(requireStaff(actor), body);
      return loadKitchenRules();
    },
  );

  return routes;
}
