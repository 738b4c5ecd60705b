/*
 * `npm run dev`: the demo for working on it. Vite serves the page from the sources and passes /api
 * on to an API that starts anew when its sources change; both say what they do on the terminal.
 */
import { installIfNeeded, requireNode } from './prepare.mjs';
import { main, runStack } from './stack.mjs';

const show = (name) => (line) => console.log(`${name.padEnd(4)} ${line}`);

await main(async () => {
  await requireNode();
  await installIfNeeded();
  await runStack({
    script: 'dev',
    splitPorts: true,
    parts: ({ env, ports }) => [
      {
        name: 'api',
        args: ['--watch', '--import', 'tsx', 'apps/api/src/entry/demo.ts'],
        env: { ...env, PORT: String(ports.api) },
        onLine: show('api'),
      },
      {
        name: 'web',
        args: ['node_modules/vite/bin/vite.js', '--clearScreen=false'],
        env: {
          TIERWELL_WEB_PORT: String(ports.app),
          TIERWELL_API_PORT: String(ports.api),
        },
        onLine: show('web'),
      },
    ],
  });
});
