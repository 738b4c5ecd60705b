import { Worker } from 'node:worker_threads';

export type ThreadTask = {
  /** `import.meta.url` of whoever starts it: the thread's file lies beside. */
  readonly beside: string;
  /** File name before `.thread.ts`; built servers have it as `<name>.thread.js`. */
  readonly name: string;
  readonly input: unknown;
  readonly transfer?: readonly ArrayBuffer[];
  readonly limitMs: number;
  readonly memoryMb: number;
};

/** The thread took too long and was ended. */
export class ThreadTimeout extends Error {
  override name = 'ThreadTimeout';
}

/**
 * Runs one task in a thread of its own and answers the one message it posts; a thread that throws,
 * runs out of memory or time takes nothing else down.
 */
export async function runInThread(task: ThreadTask): Promise<unknown> {
  const worker = startWorker(task);
  let timer: NodeJS.Timeout | undefined;
  try {
    return await new Promise((resolve, reject) => {
      timer = setTimeout(() => reject(new ThreadTimeout()), task.limitMs);
      worker.once('message', resolve);
      worker.once('error', reject);
      worker.once('exit', (code) => reject(new Error(`The thread ended with ${code}.`)));
    });
  } finally {
    clearTimeout(timer);
    await worker.terminate();
  }
}

function startWorker(task: ThreadTask): Worker {
  const options = {
    workerData: task.input,
    transferList: [...(task.transfer ?? [])],
    env: {},
    resourceLimits: { maxOldGenerationSizeMb: task.memoryMb },
  };
  if (!task.beside.endsWith('.ts')) {
    return new Worker(new URL(`./${task.name}.thread.js`, task.beside), options);
  }
  // From source: Node.js 20 reads TypeScript only through tsx, which threads do not inherit.
  const file = new URL(`./${task.name}.thread.ts`, task.beside).href;
  const start = `import('tsx/esm/api').then((tsx) => tsx.tsImport(${JSON.stringify(file)}, ${JSON.stringify(task.beside)}))`;
  return new Worker(start, { ...options, eval: true });
}
