import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import {
  instant,
  integer,
  key,
  nullable,
  oneOf,
  text,
  withDefault,
  writtenAt,
} from '../columns.ts';
import { workStates, type WorkState } from './task.ts';
import type { Assignment } from './assignment.ts';
import type { BatchShare } from './batch-share.ts';
import type { FormulaVersion } from './formula-version.ts';

/** One making of one formula for one or more orders. */
export class Batch extends Model<InferAttributes<Batch>, InferCreationAttributes<Batch>> {
  declare id: CreationOptional<string>;
  declare formulaVersionId: string;
  declare shiftId: string | null;
  declare bowls: CreationOptional<number>;
  declare weightMg: number;
  declare benchMinutes: CreationOptional<number>;
  declare mixerMinutes: CreationOptional<number>;
  declare ovenMinutes: CreationOptional<number>;
  declare state: CreationOptional<WorkState>;
  declare lot: string | null;
  declare minutesTaken: number | null;
  declare startedAt: Date | null;
  declare finishedAt: Date | null;
  declare finishedByUserId: string | null;
  declare createdAt: CreationOptional<Date>;

  declare formulaVersion?: NonAttribute<FormulaVersion>;
  declare assignment?: NonAttribute<Assignment | null>;
  declare shares?: NonAttribute<BatchShare[]>;
}

export function initBatch(sequelize: Sequelize): void {
  Batch.init(
    {
      id: key(),
      formulaVersionId: text(),
      shiftId: nullable(text()),
      bowls: withDefault(integer(), 1),
      weightMg: integer(),
      benchMinutes: withDefault(integer(), 0),
      mixerMinutes: withDefault(integer(), 0),
      ovenMinutes: withDefault(integer(), 0),
      state: withDefault(oneOf(workStates), 'planned'),
      lot: nullable(text()),
      minutesTaken: nullable(integer()),
      startedAt: nullable(instant('startedAt')),
      finishedAt: nullable(instant('finishedAt')),
      finishedByUserId: nullable(text()),
      createdAt: writtenAt('createdAt'),
    },
    { sequelize, tableName: 'batches' },
  );
}
