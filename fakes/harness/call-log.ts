import { appendFileSync, mkdirSync } from 'node:fs';
import path from 'node:path';

/** One thing a fake was asked and how it answered; `n` counts from 1 within one start. */
export type Call<Detail> = { n: number; at: string } & Detail;

export interface CallLog<Detail> {
  /** Appends one call; nothing is ever changed or removed while the fake runs. */
  add(detail: Detail): Call<Detail>;
  /** Every call since the fake started, or since the given ISO instant. */
  list(since?: string): Call<Detail>[];
}

/**
 * An append-only log of calls, in memory and, where a folder is given, as one JSON line each in
 * `calls.jsonl` inside it. Written synchronously: a test that kills the fake still finds the line.
 */
export function createCallLog<Detail extends object>(options: {
  folder: string | undefined;
  now: () => Date;
}): CallLog<Detail> {
  const calls: Call<Detail>[] = [];
  const file = options.folder === undefined ? undefined : path.join(options.folder, 'calls.jsonl');
  if (options.folder !== undefined) mkdirSync(options.folder, { recursive: true });

  return {
    add(detail) {
      const call = {
        n: calls.length + 1,
        at: options.now().toISOString(),
        ...detail,
      };
      calls.push(call);
      if (file !== undefined) appendFileSync(file, `${JSON.stringify(call)}\n`);
      return call;
    },
    list(since) {
      return since === undefined ? [...calls] : calls.filter((call) => call.at >= since);
    },
  };
}
