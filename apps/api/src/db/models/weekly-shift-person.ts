import { Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, NonAttribute, Sequelize } from 'sequelize';
import { text } from '../columns.ts';
import type { Person } from './person.ts';

/** Who works a weekly shift. */
export class WeeklyShiftPerson extends Model<
  InferAttributes<WeeklyShiftPerson>,
  InferCreationAttributes<WeeklyShiftPerson>
> {
  declare weeklyShiftId: string;
  declare personId: string;

  declare person?: NonAttribute<Person>;
}

export function initWeeklyShiftPerson(sequelize: Sequelize): void {
  WeeklyShiftPerson.init(
    {
      weeklyShiftId: { ...text(), primaryKey: true },
      personId: { ...text(), primaryKey: true },
    },
    { sequelize, tableName: 'weekly_shift_people' },
  );
}
