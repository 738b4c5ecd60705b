import { accountsRoutes } from '#api/modules/accounts/accounts.routes.ts';
import type { Deps } from '#api/modules/deps.ts';
import { healthRoutes } from '#api/modules/health/health.routes.ts';
import { menuRoutes } from '#api/modules/menu/menu.routes.ts';
import { peopleRoutes } from '#api/modules/people/people.routes.ts';
import { googleRoutes } from '#api/modules/sessions/google.routes.ts';
import { linksRoutes } from '#api/modules/sessions/links.routes.ts';
import { secondFactorRoutes } from '#api/modules/sessions/second-factor.routes.ts';
import { sessionsRoutes } from '#api/modules/sessions/sessions.routes.ts';
import type { FeatureRoutes } from './route.ts';

/** Every feature's routes, in the order the API page lists them. */
export function featureRoutes(deps: Deps): readonly FeatureRoutes[] {
  return [
    menuRoutes(deps),
    sessionsRoutes(deps),
    linksRoutes(deps),
    googleRoutes(deps),
    secondFactorRoutes(deps),
    accountsRoutes(deps),
    peopleRoutes(deps),
    healthRoutes(deps),
  ];
}
