import { start as startWorker } from '#api/entry/worker.ts';
import { startTestApp, type TestApp, type TestAppOptions } from './test-app.ts';

/**
 * The whole program on a free port, as its entry runs it: the API with its worker, over a database
 * file of its own and a clock that is set.
 */
export async function startTestStudio(options: TestAppOptions): Promise<TestApp> {
  const app = await startTestApp(options);
  const worker = await startWorker(app.deps);
  return {
    ...app,
    async close() {
      await worker.stop();
      await app.close();
    },
  };
}
