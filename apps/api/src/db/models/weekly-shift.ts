import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { integer, key, nullable, text } from '../columns.ts';
import type { WeeklyShiftPerson } from './weekly-shift-person.ts';

/** A stretch of work that comes every week. */
export class WeeklyShift extends Model<
  InferAttributes<WeeklyShift>,
  InferCreationAttributes<WeeklyShift>
> {
  declare id: CreationOptional<string>;
  /** ISO 8601: Monday is 1. */
  declare weekday: number;
  declare startMinute: number;
  declare endMinute: number;
  declare validFrom: string | null;
  declare validUntil: string | null;

  declare people?: NonAttribute<WeeklyShiftPerson[]>;
}

export function initWeeklyShift(sequelize: Sequelize): void {
  WeeklyShift.init(
    {
      id: key(),
      weekday: integer(),
      startMinute: integer(),
      endMinute: integer(),
      validFrom: nullable(text()),
      validUntil: nullable(text()),
    },
    { sequelize, tableName: 'weekly_shifts' },
  );
}
