import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { integer, key, nullable, text, withDefault } from '../columns.ts';

/** Work that must follow other work, with a gap in elapsed minutes. */
export class TaskLink extends Model<InferAttributes<TaskLink>, InferCreationAttributes<TaskLink>> {
  declare id: CreationOptional<string>;
  declare beforeTaskId: string | null;
  declare beforeBatchId: string | null;
  declare afterTaskId: string | null;
  declare afterBatchId: string | null;
  declare gapMinutes: CreationOptional<number>;
  /** Shelf life of what the first makes: the second starts at most so long after it ends. */
  declare keepsMinutes: number | null;
}

export function initTaskLink(sequelize: Sequelize): void {
  TaskLink.init(
    {
      id: key(),
      beforeTaskId: nullable(text()),
      beforeBatchId: nullable(text()),
      afterTaskId: nullable(text()),
      afterBatchId: nullable(text()),
      gapMinutes: withDefault(integer(), 0),
      keepsMinutes: nullable(integer()),
    },
    { sequelize, tableName: 'task_links' },
  );
}
