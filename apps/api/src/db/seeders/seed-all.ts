import { today } from '#shared/dates/local-time.ts';
import type { Database } from '#api/db/database.ts';
import type { Clock } from '#api/platform/clock.ts';
import { studio } from './catalogue/studio.ts';
import { seedPlan } from './plan.ts';
import { runOnce } from './run-once.ts';
import { seedCatalogue } from './seed-catalogue.ts';
import { seedPantry } from './seed-pantry.ts';
import { seedStudio } from './seed-studio.ts';

export type SeedOptions = {
  readonly clock: Clock;
  /** With people who can sign in, customers and orders; and no second factor asked. */
  readonly demo: boolean;
};

/**
 * Fills a migrated database with the studio, its pantry, menu, prices and texts. Each part is
 * written once per database, so running it again changes nothing.
 */
export async function seedAll(_database: Database, options: SeedOptions): Promise<void> {
  const now = options.clock.now();
  const day = today(now, studio.zone);
  await runOnce('pantry', () => seedPantry(day));
  await runOnce('catalogue', seedCatalogue);
  await runOnce('studio', () =>
    seedStudio({ now, today: day, requireSecondFactor: !options.demo }),
  );
  await runOnce('plan', () => seedPlan({ now, today: day }));
}
