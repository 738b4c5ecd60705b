import { seedAll } from '#api/db/seeders/seed-all.ts';
import { offerFirstOwner } from '#api/modules/people/offer-first-owner.command.ts';
import { run } from './run.ts';

/** `npm start`: production, configured by environment variables alone. */
await run('production', async (deps) => {
  await seedAll(deps.database, { clock: deps.clock, demo: false });
  const address = await offerFirstOwner(deps);
  if (address === null) return;
  console.log('Nobody works here yet. Make the first owner’s account here, within seven days:');
  console.log(`  ${address}`);
});
