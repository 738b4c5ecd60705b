import { Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize';
import { instant, text } from '../columns.ts';

/** When a worker last went round. */
export class WorkerBeat extends Model<
  InferAttributes<WorkerBeat>,
  InferCreationAttributes<WorkerBeat>
> {
  declare name: string;
  declare at: Date;
}

export function initWorkerBeat(sequelize: Sequelize): void {
  WorkerBeat.init(
    {
      name: { ...text(), primaryKey: true },
      at: instant('at'),
    },
    { sequelize, tableName: 'worker_beats' },
  );
}
