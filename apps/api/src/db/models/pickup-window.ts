import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { integer, key, text } from '../columns.ts';

/** An exception on one day: another window, or one with no handovers. */
export class PickupWindow extends Model<
  InferAttributes<PickupWindow>,
  InferCreationAttributes<PickupWindow>
> {
  declare id: CreationOptional<string>;
  declare localDate: string;
  declare startMinute: number;
  declare minutes: number;
  declare handovers: number;
}

export function initPickupWindow(sequelize: Sequelize): void {
  PickupWindow.init(
    {
      id: key(),
      localDate: text(),
      startMinute: integer(),
      minutes: integer(),
      handovers: integer(),
    },
    { sequelize, tableName: 'pickup_windows' },
  );
}
