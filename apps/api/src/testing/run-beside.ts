import { spawn } from 'node:child_process';

/** A process that ran to its end beside a test. */
export type Ended = { readonly code: number | null; readonly output: string };

/**
 * Runs a module of ours as a process of its own, as a second server on the same file would be.
 * @param args given to it as they are
 */
export function runBeside(module: string, args: readonly string[], env = {}): Promise<Ended> {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, ['--import', 'tsx', module, ...args], {
      env: { ...process.env, ...env },
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    let output = '';
    const hear = (chunk: Buffer): void => {
      output += chunk.toString();
    };
    child.stdout.on('data', hear);
    child.stderr.on('data', hear);
    child.once('error', reject);
    child.once('close', (code) => resolve({ code, output }));
  });
}
