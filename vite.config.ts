import { readdirSync } from 'node:fs';
import { copyFile, mkdir, readFile, readdir, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { promisify } from 'node:util';
import { brotliCompress, constants, gzip } from 'node:zlib';
import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import type { Plugin } from 'vite';
import { defineConfig } from 'vitest/config';

const root = import.meta.dirname;
const apiSource = path.join(root, 'apps/api/src');
const webSource = path.join(root, 'apps/web/src');

/** Ports of `npm run dev`: the page is served on the first, the API listens on the second. */
const webPort = Number(process.env.TIERWELL_WEB_PORT ?? 4100);
const apiPort = Number(process.env.TIERWELL_API_PORT ?? 4104);

/**
 * What the server is built from: every entry, and every `*.thread.ts` (code that a worker thread
 * loads as a file of its own). All come out flat, `dist/server/<name>.js`, so that a thread is
 * found beside whichever file starts it.
 */
function serverEntries(): Record<string, string> {
  const entries = readdirSync(path.join(apiSource, 'entry'))
    .filter((name) => name.endsWith('.ts') && !name.includes('.test.'))
    .map((name) => path.join(apiSource, 'entry', name));
  const threads = readdirSync(apiSource, { recursive: true, encoding: 'utf8' })
    .filter((name) => name.endsWith('.thread.ts'))
    .map((name) => path.join(apiSource, name));
  return Object.fromEntries(
    [...entries, ...threads].map((file) => [path.basename(file, '.ts'), file]),
  );
}

/** Files worth sending compressed; fonts and pictures already are. */
const compressible = /\.(?:js|css|svg|json|map|txt|webmanifest)$/;

/** Writes `.br` and `.gz` beside every hashed asset once, so that no request pays for it. */
function precompress(): Plugin {
  return {
    name: 'tierwell:precompress',
    apply: (_config, env) => env.command === 'build' && env.isSsrBuild !== true,
    async writeBundle(options) {
      const assets = path.join(options.dir ?? 'dist/client', 'assets');
      const names = (await readdir(assets)).filter((name) => compressible.test(name));
      await Promise.all(
        names.map(async (name) => {
          const file = path.join(assets, name);
          const bytes = await readFile(file);
          const [br, gz] = await Promise.all([
            promisify(brotliCompress)(bytes, {
              params: {
                [constants.BROTLI_PARAM_QUALITY]: constants.BROTLI_MAX_QUALITY,
              },
            }),
            promisify(gzip)(bytes, { level: constants.Z_BEST_COMPRESSION }),
          ]);
          await Promise.all([writeFile(`${file}.br`, br), writeFile(`${file}.gz`, gz)]);
        }),
      );
    },
  };
}

/** The fonts of printed cards lie beside the built server, as they lie beside their source. */
function printedFonts(): Plugin {
  const folder = path.join(apiSource, 'modules/cards/pdf/fonts');
  return {
    name: 'tierwell:printed-fonts',
    apply: 'build',
    async writeBundle(options) {
      const target = path.join(options.dir ?? 'dist/server', 'fonts');
      await mkdir(target, { recursive: true });
      const names = (await readdir(folder)).filter((name) => name.endsWith('.ttf'));
      await Promise.all(
        names.map((name) => copyFile(path.join(folder, name), path.join(target, name))),
      );
    },
  };
}

type Modules = { getModuleInfo(id: string): { importedIds: readonly string[] } | null };

/** Everything these sources load at once, without what they load later. */
function loadedWith(sources: readonly string[], modules: Modules): ReadonlySet<string> {
  const found = new Set<string>();
  const add = (id: string) => {
    if (found.has(id)) return;
    found.add(id);
    for (const imported of modules.getModuleInfo(id)?.importedIds ?? []) add(imported);
  };
  for (const source of sources) add(path.join(webSource, source));
  return found;
}

const calendar = 'features/order-wizard/components/day/day-calendar.tsx';
/** What a visitor on the way to an order loads first: the frame, the first step and its calendar. */
const firstLoaded = ['main.tsx', 'routes/order/order-routes.tsx', calendar];
/** Pages that read a little of what is the wizard's, and must not load the wizard for it. */
const besideWizard = ['routes/home/home-page.tsx', 'routes/menu/menu-page.tsx'];

/**
 * The first load in a few files: left alone it becomes three dozen, most of half a kilobyte, each a
 * request of its own and each compressed alone. Libraries are apart because they seldom change.
 */
function clientGroups() {
  const wizard = /\/(?:features\/order-wizard|routes\/order)\//;
  let first: ReadonlySet<string> | null = null;
  let beside: ReadonlySet<string> | null = null;
  const ownGroup = (id: string, modules: Modules): string | null => {
    first ??= loadedWith(firstLoaded, modules);
    beside ??= loadedWith(besideWizard, modules);
    if (!first.has(id) || id.endsWith(calendar)) return null;
    return wizard.test(id) && !beside.has(id) ? 'order' : 'app';
  };
  return [
    {
      name: 'libraries',
      test: /node_modules\/(?:react|react-dom|scheduler|react-router|@tanstack\/(?:react-query|query-core)|zod)\//,
      priority: 2,
    },
    { name: 'form', test: /node_modules\/react-hook-form\//, priority: 1 },
    { name: ownGroup, test: /\/(?:apps\/web|packages\/shared)\/src\// },
  ];
}

/** `vite build` makes the client, `vite build --ssr` the server; `npm run build` runs both. */
export default defineConfig(({ isSsrBuild }) => ({
  root,
  publicDir: 'apps/web/public',
  appType: 'spa',
  plugins: isSsrBuild ? [printedFonts()] : [react(), tailwindcss(), precompress()],
  server: {
    host: '127.0.0.1',
    port: webPort,
    strictPort: true,
    proxy: {
      '/api': { target: `http://127.0.0.1:${apiPort}`, changeOrigin: false },
    },
    watch: { ignored: ['**/.data/**', '**/dist/**', '**/test-results/**'] },
  },
  build: isSsrBuild
    ? {
        ssr: true,
        outDir: 'dist/server',
        target: 'node20',
        sourcemap: true,
        minify: false,
        copyPublicDir: false,
        rolldownOptions: {
          input: serverEntries(),
          output: {
            entryFileNames: '[name].js',
            chunkFileNames: '[name]-[hash].js',
          },
        },
      }
    : {
        outDir: 'dist/client',
        manifest: true,
        target: 'es2022',
        assetsInlineLimit: 0,
        // Every browser this is built for preloads modules by itself.
        modulePreload: { polyfill: false },
        rolldownOptions: { output: { codeSplitting: { groups: clientGroups() } } },
      },
  test: {
    // Two at a time: the tests share two cores with real SQLite files and real servers.
    maxWorkers: 2,
    testTimeout: 30_000,
    hookTimeout: 30_000,
    restoreMocks: true,
    projects: [
      {
        extends: true,
        test: {
          name: 'unit',
          environment: 'node',
          include: ['{packages/shared/src,apps/api/src,fakes}/**/*.test.ts'],
        },
      },
      {
        extends: true,
        test: {
          name: 'web',
          environment: 'jsdom',
          setupFiles: ['apps/web/src/testing/setup.ts'],
          include: ['apps/web/src/**/*.test.{ts,tsx}'],
        },
      },
    ],
  },
}));
