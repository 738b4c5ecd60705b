import process from 'node:process';
import { literal } from 'sequelize';
import { openDatabase } from '#api/db/database.ts';
import { PlanState } from '#api/db/models/plan-state.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { systemClock } from '#api/platform/clock.ts';
import { createLogger } from '#api/platform/logger.ts';

/** Run as a process of its own beside a test: reads and writes one row as often as it is told. */
const [dataDir = '', times = '0'] = process.argv.slice(2);

const database = await openDatabase(dataDir, {
  clock: systemClock,
  logger: createLogger('silent'),
});
await Promise.all(
  Array.from({ length: Number(times) }, () =>
    inTransaction(async () => {
      const state = await PlanState.findByPk(1, { rejectOnEmpty: true });
      await PlanState.update({ planVersion: state.planVersion + 1 }, { where: { id: 1 } });
      await PlanState.update(
        { settingsVersion: literal('settings_version + 1') },
        { where: { id: 1 } },
      );
    }),
  ),
);
await database.close();
