import type { Database } from '#api/db/current-database.ts';
import type { Clock } from '#api/platform/clock.ts';
import type { Env } from '#api/platform/env.ts';
import type { Logger } from '#api/platform/logger.ts';

/**
 * What routes, commands and jobs are given from outside; a function asks only for the part it
 * needs (`Pick<Deps, 'clock'>`), so that a test hands it no more.
 */
export type Deps = {
  readonly database: Database;
  readonly clock: Clock;
  readonly env: Env;
  readonly logger: Logger;
};
