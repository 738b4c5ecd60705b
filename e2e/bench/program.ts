import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdtemp, open, rm } from 'node:fs/promises';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { start as startSmtp } from '#fakes/smtp/start.ts';
import { buildIfNeeded, root } from '#fakes/prepare.mjs';

export type Running = { readonly url: string; stop(): Promise<void> };

/** How long a program may take until it answers. */
const readyWithinMs = 120_000;

/** A port of this computer that nobody uses just now. */
export async function freePort(): Promise<number> {
  const server = createServer().listen(0, '127.0.0.1');
  await once(server, 'listening');
  const address = server.address();
  server.close();
  await once(server, 'close');
  if (address === null || typeof address === 'string') throw new Error('no free port');
  return address.port;
}

/** The built program with the demo's studio, as it is run: logging on, its worker in it. */
export async function startProgram(): Promise<Running> {
  await buildIfNeeded();
  const folder = await mkdtemp(path.join(tmpdir(), 'tierwell-bench-'));
  const smtp = await startSmtp({ port: 0, smtpPort: 0 });
  const port = await freePort();
  const url = `http://127.0.0.1:${port}`;
  const log = await open(path.join(folder, 'log'), 'w');
  const child = spawn(process.execPath, ['dist/server/demo.js'], {
    cwd: root,
    stdio: ['ignore', log.fd, log.fd],
    env: {
      ...process.env,
      NODE_ENV: 'production',
      PORT: String(port),
      PUBLIC_URL: url,
      TIERWELL_DATA: path.join(folder, 'data'),
      SMTP_URL: smtp.smtpUrl,
      LOG_LEVEL: 'info',
    },
  });
  const stop = async () => {
    await end(child);
    await Promise.all([log.close(), smtp.stop()]);
    await rm(folder, { recursive: true, force: true });
  };
  try {
    await untilAnswers(`${url}/api/ready`, child);
  } catch (error) {
    await stop();
    throw error;
  }
  return { url, stop };
}

/** A module of the bench as a process of its own, on a free port given as its first argument. */
export async function startBeside(module: string, args: readonly string[]): Promise<Running> {
  const port = await freePort();
  const child = spawn(
    process.execPath,
    ['--import', 'tsx', path.join(import.meta.dirname, module), String(port), ...args],
    { cwd: root, stdio: 'inherit', env: { ...process.env, NODE_ENV: 'production' } },
  );
  const url = `http://127.0.0.1:${port}`;
  await untilAnswers(url, child);
  return { url, stop: () => end(child) };
}

async function untilAnswers(url: string, child: ChildProcess): Promise<void> {
  for (let waited = 0; waited < readyWithinMs; waited += 100) {
    if (child.exitCode !== null) throw new Error(`the program of ${url} ended by itself`);
    const answer = await fetch(url).catch(() => null);
    if (answer?.ok === true) return;
    await pause(100);
  }
  throw new Error(`${url} does not answer`);
}

async function end(child: ChildProcess): Promise<void> {
  if (child.exitCode !== null || child.signalCode !== null) return;
  const ended = once(child, 'exit');
  child.kill('SIGTERM');
  await ended;
}
