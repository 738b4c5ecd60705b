import { Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, NonAttribute, Sequelize } from 'sequelize';
import { text } from '../columns.ts';
import type { Person } from './person.ts';

/** Who works a shift. */
export class ShiftPerson extends Model<
  InferAttributes<ShiftPerson>,
  InferCreationAttributes<ShiftPerson>
> {
  declare shiftId: string;
  declare personId: string;

  declare person?: NonAttribute<Person>;
}

export function initShiftPerson(sequelize: Sequelize): void {
  ShiftPerson.init(
    {
      shiftId: { ...text(), primaryKey: true },
      personId: { ...text(), primaryKey: true },
    },
    { sequelize, tableName: 'shift_people' },
  );
}
