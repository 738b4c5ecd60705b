import { readdirSync } from 'node:fs';
import { readFile, readdir, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { promisify } from 'node:util';
import { brotliCompress, constants, gzip } from 'node:zlib';
import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import type { Plugin } from 'vite';
import { defineConfig } from 'vitest/config';

const root = import.meta.dirname;
const apiSource = path.join(root, 'apps/api/src');

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

/**
 * What most pages share travels together: left alone it becomes dozens of files of half a kilobyte,
 * each a request of its own and each compressed alone.
 */
const clientGroups = [
  {
    name: 'parts',
    test: /apps\/web\/src\/(?:components\/ui|lib|config)\/|packages\/shared\/src\/dates\//,
    minShareCount: 5,
  },
  {
    name: 'contracts',
    test: /node_modules\/zod|packages\/shared\/src\/contracts\//,
    minShareCount: 3,
  },
];

/** `vite build` makes the client, `vite build --ssr` the server; `npm run build` runs both. */
export default defineConfig(({ isSsrBuild }) => ({
  root,
  publicDir: 'apps/web/public',
  appType: 'spa',
  plugins: isSsrBuild ? [] : [react(), tailwindcss(), precompress()],
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
        rolldownOptions: { output: { codeSplitting: { groups: clientGroups } } },
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
