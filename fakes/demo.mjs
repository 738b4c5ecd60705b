/*
 * `npm run demo`: from a clean clone to a running studio. Installs and builds what is missing, then
 * runs the built application with the fakes beside it. PORT and TIERWELL_DATA choose where;
 * `-- --reset` begins with an empty studio.
 */
import { buildIfNeeded, installIfNeeded, requireNode } from './prepare.mjs';
import { main, runStack } from './stack.mjs';

await main(async () => {
  await requireNode();
  await installIfNeeded();
  await buildIfNeeded();
  await runStack({
    script: 'demo',
    splitPorts: false,
    parts: ({ env, ports }) => [
      {
        name: 'app',
        args: ['--enable-source-maps', 'dist/server/demo.js'],
        env: { ...env, PORT: String(ports.app) },
      },
    ],
  });
});
