import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { flag, integer, key, withDefault } from '../columns.ts';

/** When customers may collect, every week. */
export class WeeklyPickupWindow extends Model<
  InferAttributes<WeeklyPickupWindow>,
  InferCreationAttributes<WeeklyPickupWindow>
> {
  declare id: CreationOptional<string>;
  /** ISO 8601: Monday is 1. */
  declare weekday: number;
  declare startMinute: number;
  declare minutes: number;
  declare handovers: number;
  declare active: CreationOptional<boolean>;
}

export function initWeeklyPickupWindow(sequelize: Sequelize): void {
  WeeklyPickupWindow.init(
    {
      id: key(),
      weekday: integer(),
      startMinute: integer(),
      minutes: integer(),
      handovers: integer(),
      active: withDefault(flag('active'), true),
    },
    { sequelize, tableName: 'weekly_pickup_windows' },
  );
}
