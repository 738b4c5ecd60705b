/*
 * `npm test`: everything that must hold, from a clean clone. Installs what is missing, then runs
 * the static checks beside each other, the unit, API and page tests, the build, and the browser
 * journeys; stops at the first stage that fails. The closing line carries the sum of the tests.
 */
import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import {
  Unready,
  buildIfNeeded,
  installIfNeeded,
  requireNode,
  root,
  run,
} from '../fakes/prepare.mjs';

const chromium = '/usr/bin/chromium';
const reports = await mkdtemp(path.join(tmpdir(), 'tierwell-test-'));
const total = { passed: 0, failed: 0 };

/** Chromium is Debian's; it is installed where that can be done without asking anybody. */
async function installChromium() {
  if (existsSync(chromium)) return;
  if (process.getuid?.() !== 0 || !existsSync('/usr/bin/apt-get')) {
    throw new Unready(`The browser tests need ${chromium}. On Debian: apt-get install chromium`);
  }
  const env = { DEBIAN_FRONTEND: 'noninteractive' };
  await run('apt-get', ['update', '-q'], env);
  await run('apt-get', ['install', '-y', '-q', 'chromium'], env);
}

const bin = (name) => path.join(root, 'node_modules/.bin', name);

/** Runs a check quietly and shows what it said once it is done. */
async function check({ name, command, args }) {
  const started = performance.now();
  const child = spawn(bin(command), args, { cwd: root, stdio: ['ignore', 'pipe', 'pipe'] });
  const output = [];
  child.stdout.on('data', (chunk) => output.push(chunk));
  child.stderr.on('data', (chunk) => output.push(chunk));
  const code = await new Promise((resolve) => child.once('close', resolve));
  console.log(`  ${name}: ${code === 0 ? 'ok' : 'FAILED'}, ${seconds(started)}`);
  if (code !== 0) console.log(Buffer.concat(output).toString());
  return code === 0;
}

const staticChecks = [
  { name: 'types', command: 'tsc', args: ['--noEmit'] },
  { name: 'lint', command: 'eslint', args: ['.', '--max-warnings=0'] },
  {
    name: 'imports',
    command: 'depcruise',
    args: ['--config', 'e2e/tools/import-rules.mjs', 'apps', 'packages', 'fakes', 'e2e'],
  },
  { name: 'unused', command: 'knip', args: [] },
  { name: 'format', command: 'prettier', args: ['--check', '--log-level=warn', '.'] },
];

async function runStaticChecks() {
  const results = await Promise.all(staticChecks.map(check));
  if (results.includes(false)) throw new Unready('A static check failed.');
}

/** Adds a reporter's numbers, if it came far enough to write them. */
async function count(report, numbersOf) {
  if (!existsSync(report)) return;
  const { passed, failed } = numbersOf(JSON.parse(await readFile(report, 'utf8')));
  total.passed += passed;
  total.failed += failed;
}

async function runVitest() {
  const report = path.join(reports, 'vitest.json');
  try {
    await run(bin('vitest'), [
      'run',
      '--reporter=default',
      '--reporter=json',
      `--outputFile.json=${report}`,
    ]);
  } finally {
    await count(report, (r) => ({ passed: r.numPassedTests, failed: r.numFailedTests }));
  }
}

async function runPlaywright() {
  const report = path.join(reports, 'playwright.json');
  try {
    await run(
      bin('playwright'),
      ['test', '--config', 'e2e/playwright.config.ts', '--reporter=list,json'],
      { PLAYWRIGHT_JSON_OUTPUT_FILE: report },
    );
  } finally {
    await count(report, ({ stats }) => ({
      passed: stats.expected + stats.flaky,
      failed: stats.unexpected,
    }));
  }
}

const stages = [
  ['install', installIfNeeded],
  ['browser', installChromium],
  ['static checks', runStaticChecks],
  ['unit, API and page tests', runVitest],
  ['build', buildIfNeeded],
  ['browser tests', runPlaywright],
];

const seconds = (since) => `${((performance.now() - since) / 1000).toFixed(1)} s`;

async function runStages() {
  await requireNode();
  for (const [name, stage] of stages) {
    const started = performance.now();
    console.log(`\n== ${name}`);
    try {
      await stage();
    } catch (error) {
      console.error(error instanceof Unready ? error.message : error);
      throw new Unready(`Stopped: "${name}" failed after ${seconds(started)}.`);
    }
    console.log(`== ${name}: ${seconds(started)}`);
  }
}

try {
  await runStages();
} catch (error) {
  console.error(`\n${error.message}`);
  // A stage can fail without any test of its own failing; the closing line says so all the same.
  if (total.failed === 0) total.failed = 1;
  process.exitCode = 1;
} finally {
  await rm(reports, { recursive: true });
  console.log(`\n${total.passed} passed, ${total.failed} failed`);
}
