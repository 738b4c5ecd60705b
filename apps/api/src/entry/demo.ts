import { seedAll } from '#api/db/seeders/seed-all.ts';
import { run } from './run.ts';

/** The demo's and the developer's program: an invented studio with people to be. */
await run('demo', async (deps) => {
  await seedAll(deps.database, { clock: deps.clock, demo: true });
});
