import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { flag, instant, integer, key, nullable, text, withDefault } from '../columns.ts';
import type { Assignment } from './assignment.ts';
import type { ShiftPerson } from './shift-person.ts';

/** A stretch of one day: written down from the weekly pattern when work is put in it, or an exception to it. */
export class Shift extends Model<InferAttributes<Shift>, InferCreationAttributes<Shift>> {
  declare id: CreationOptional<string>;
  declare localDate: string;
  declare startMinute: number;
  declare endMinute: number;
  declare startAt: Date;
  declare endAt: Date;
  declare weeklyShiftId: string | null;
  /** People x length x utilisation, rounded down. */
  declare benchMinutes: number;
  declare mixerMinutes: number;
  /** Decks x length. */
  declare ovenMinutes: number;
  /** An exception: nobody works it. */
  declare off: CreationOptional<boolean>;
  declare note: CreationOptional<string>;

  declare people?: NonAttribute<ShiftPerson[]>;
  declare assignments?: NonAttribute<Assignment[]>;
}

export function initShift(sequelize: Sequelize): void {
  Shift.init(
    {
      id: key(),
      localDate: text(),
      startMinute: integer(),
      endMinute: integer(),
      startAt: instant('startAt'),
      endAt: instant('endAt'),
      weeklyShiftId: nullable(text()),
      benchMinutes: integer(),
      mixerMinutes: integer(),
      ovenMinutes: integer(),
      off: withDefault(flag('off'), false),
      note: withDefault(text(), ''),
    },
    { sequelize, tableName: 'shifts' },
  );
}
