import type { Deps } from '#api/modules/deps.ts';
import type { FeatureRoutes } from './route.ts';

/** Every feature's routes, in the order the API page lists them. */
export function featureRoutes(_deps: Deps): readonly FeatureRoutes[] {
  return [];
}
