import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { flag, instant, integer, key, nullable, text, withDefault } from '../columns.ts';
import type { Batch } from './batch.ts';
import type { Shift } from './shift.ts';
import type { Task } from './task.ts';

/** The time the plan gives a task or batch. */
export class Assignment extends Model<
  InferAttributes<Assignment>,
  InferCreationAttributes<Assignment>
> {
  declare id: CreationOptional<string>;
  declare taskId: string | null;
  declare batchId: string | null;
  declare shiftId: string;
  declare startAt: Date;
  declare minutes: number;
  declare pinned: CreationOptional<boolean>;
  /** The version that put it here. */
  declare planVersion: number;

  declare task?: NonAttribute<Task | null>;
  declare batch?: NonAttribute<Batch | null>;
  declare shift?: NonAttribute<Shift>;
}

export function initAssignment(sequelize: Sequelize): void {
  Assignment.init(
    {
      id: key(),
      taskId: nullable(text()),
      batchId: nullable(text()),
      shiftId: text(),
      startAt: instant('startAt'),
      minutes: integer(),
      pinned: withDefault(flag('pinned'), false),
      planVersion: integer(),
    },
    { sequelize, tableName: 'assignments' },
  );
}
