import { demoStaff } from '#api/modules/demo/demo-people.ts';
import { fillDemo } from '#api/modules/demo/fill-demo.command.ts';
import { systemClock } from '#api/platform/clock.ts';
import { run } from './run.ts';

/**
 * The demo's and the developer's program: an invented studio with people and orders. Who can sign
 * in is told between two marks, for whatever started it to show.
 */
await run(
  'demo',
  async () => {
    console.log('--- people');
    for (const { role, email, password } of demoStaff) {
      console.log(`${role.padEnd(8)} ${email.padEnd(24)} ${password}`);
    }
    console.log('--- end');
  },
  (parts) => fillDemo(parts, systemClock.now()),
);
