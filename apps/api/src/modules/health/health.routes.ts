import { health, itIsAlive, readiness } from '#shared/contracts/health.ts';
import { createRoutes, type FeatureRoutes } from '#api/http/route.ts';
import type { Deps } from '#api/modules/deps.ts';
import { AppError } from '#api/platform/app-error.ts';
import { checkReadiness } from './readiness.queries.ts';

/** For whatever watches the program: is it there, and may it be sent people. */
export function healthRoutes(deps: Deps): FeatureRoutes {
  const routes = createRoutes('anonymous');

  routes.add(
    {
      name: 'check-health',
      method: 'get',
      path: '/api/health',
      summary: 'The program answers.',
      response: health,
    },
    () => itIsAlive,
  );

  routes.add(
    {
      name: 'check-readiness',
      method: 'get',
      path: '/api/ready',
      summary: 'The database answers, is up to date, and a worker goes round.',
      response: readiness,
      refusals: ['unavailable'],
    },
    async () => {
      const found = await checkReadiness(deps);
      if (found.database && found.migrations && found.worker) return found;
      throw new AppError('unavailable', { facts: found });
    },
  );

  return routes;
}
