/*
 * The processes of one running stack: started in an order, stopped in the reverse one. Each is in
 * a process group of its own, so that Ctrl-C reaches only us and we decide who goes when; each has
 * an IPC channel, whose closing tells it that we are gone (see stop-with-parent.mjs).
 */
import { spawn } from 'node:child_process';
import { createWriteStream } from 'node:fs';
import path from 'node:path';
import { createInterface } from 'node:readline';
import { root } from './prepare.mjs';

const stopWithParent = path.join(import.meta.dirname, 'stop-with-parent.mjs');

/** How long a process may take to stop before it is ended. */
const patienceMs = 15_000;
/** How many of a process's last lines are shown when it dies. */
const lastLines = 20;

/**
 * @param {string} logFolder where each process's output is kept, one file each
 * @param {(message: string) => void} onDeath told once when a process ends by itself
 */
export function createChildren(logFolder, onDeath) {
  const running = [];
  let stopping = false;

  function start({ name, args, env, onLine }) {
    const child = spawn(process.execPath, ['--import', stopWithParent, ...args], {
      cwd: root,
      detached: true,
      stdio: ['ignore', 'pipe', 'pipe', 'ipc'],
      env: { ...process.env, ...env },
    });
    const log = createWriteStream(path.join(logFolder, `${name}.log`), { flags: 'a' });
    const recent = [];
    for (const stream of [child.stdout, child.stderr]) {
      createInterface({ input: stream }).on('line', (line) => {
        log.write(`${line}\n`);
        recent.push(line);
        if (recent.length > lastLines) recent.shift();
        onLine?.(line);
      });
    }
    const ended = new Promise((resolve) => {
      child.once('close', (code, signal) => {
        log.end();
        resolve();
        if (stopping) return;
        const how = signal ?? `code ${code}`;
        onDeath(`${name} ended by itself (${how}). Its last words:\n${recent.join('\n')}`);
      });
    });
    running.push({ child, ended });
  }

  async function stop() {
    stopping = true;
    for (const { child, ended } of running.toReversed()) {
      if (child.exitCode === null && child.signalCode === null) child.kill('SIGTERM');
      const tooLong = setTimeout(() => killGroup(child), patienceMs);
      await ended;
      clearTimeout(tooLong);
    }
  }

  function kill() {
    stopping = true;
    for (const { child } of running) killGroup(child);
  }

  return { start, stop, kill };
}

function killGroup(child) {
  try {
    process.kill(-child.pid, 'SIGKILL');
  } catch {
    // It is gone already.
  }
}
