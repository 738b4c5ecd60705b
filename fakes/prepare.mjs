/*
 * What has to be there before anything of ours can run: Node, the packages, the build. Plain
 * JavaScript with nothing but Node's own modules, because it runs before anything is installed.
 */
import { spawn } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync } from 'node:fs';
import { readFile, readdir, writeFile } from 'node:fs/promises';
import path from 'node:path';

export const root = path.resolve(import.meta.dirname, '..');

/** Somebody reads this message on a terminal; it needs no stack. */
export class Unready extends Error {}

const readJson = async (file) => JSON.parse(await readFile(path.join(root, file), 'utf8'));

/** Throws unless this Node is one that package.json allows (its `engines.node`, `>=major.minor`). */
export async function requireNode() {
  const { engines } = await readJson('package.json');
  const [major, minor] = engines.node.replace('>=', '').split('.').map(Number);
  const [ourMajor, ourMinor] = process.versions.node.split('.').map(Number);
  if (ourMajor > major || (ourMajor === major && ourMinor >= minor)) return;
  throw new Unready(
    `Tierwell needs Node.js ${major}.${minor} or newer; this is ${process.versions.node}.`,
  );
}

/** Runs a command in the repository, its output shown; throws when it fails. */
export async function run(command, args, env = {}) {
  const child = spawn(command, args, {
    cwd: root,
    stdio: 'inherit',
    env: { ...process.env, ...env },
  });
  const code = await new Promise((resolve, reject) => {
    child.once('error', reject);
    child.once('exit', resolve);
  });
  if (code !== 0) throw new Unready(`"${command} ${args.join(' ')}" failed.`);
}

/**
 * Whether node_modules holds what package-lock.json asks for. npm notes what it installed in
 * `node_modules/.package-lock.json` once it is done, so a broken install counts as none.
 */
async function isInstalled() {
  if (!existsSync(path.join(root, 'node_modules/.package-lock.json'))) return false;
  const wanted = (await readJson('package-lock.json')).packages;
  const installed = (await readJson('node_modules/.package-lock.json')).packages;
  return Object.entries(wanted).every(
    ([name, { version, optional }]) =>
      name === '' || optional === true || installed[name]?.version === version,
  );
}

/** Installs the packages exactly as locked, unless they are there already. */
export async function installIfNeeded() {
  if (await isInstalled()) return;
  console.log('Installing packages; the first time this takes two to three minutes.');
  await run('npm', ['ci', '--loglevel=error']);
}

/** What the build is made from. */
const sources = [
  'apps',
  'packages',
  'index.html',
  'package.json',
  'package-lock.json',
  'tsconfig.json',
  'vite.config.ts',
];

async function hashOfSources() {
  const hash = createHash('sha256');
  for (const source of sources) {
    const absolute = path.join(root, source);
    if (!existsSync(absolute)) continue;
    const files = path.extname(source)
      ? [absolute]
      : (await readdir(absolute, { recursive: true, withFileTypes: true }))
          .filter((entry) => entry.isFile() && !entry.name.includes('.test.'))
          .map((entry) => path.join(entry.parentPath, entry.name))
          .sort();
    for (const file of files) hash.update(`${file}\0`).update(await readFile(file));
  }
  return hash.digest('hex');
}

/** Builds client and server into dist, unless they were built from these very sources. */
export async function buildIfNeeded() {
  const stamp = path.join(root, 'dist/.sources');
  const hash = await hashOfSources();
  if (existsSync(stamp) && (await readFile(stamp, 'utf8')) === hash) return;
  console.log('Building.');
  await run('npm', ['run', 'build', '--silent']);
  await writeFile(stamp, hash);
}
