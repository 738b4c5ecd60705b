import { seedAll } from '#api/db/seeders/seed-all.ts';
import { currentClock, currentDatabase } from '#api/db/current-database.ts';
import type { TestDatabaseOptions } from './fresh-database.ts';

/** A database with the studio, its menu and prices, and nobody in it. */
export const seededStudio: NonNullable<TestDatabaseOptions['seeded']> = {
  name: 'studio',
  seed: () => seedAll(currentDatabase(), { clock: currentClock(), demo: false }),
};
