import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { integer, key, nullable, text } from '../columns.ts';

/** The owner's own limit of orders a day, by occasion and weekday or date; null means any. */
export class DayCap extends Model<InferAttributes<DayCap>, InferCreationAttributes<DayCap>> {
  declare id: CreationOptional<string>;
  declare occasionId: string | null;
  /** ISO 8601: Monday is 1. */
  declare weekday: number | null;
  declare localDate: string | null;
  declare maxOrders: number;
}

export function initDayCap(sequelize: Sequelize): void {
  DayCap.init(
    {
      id: key(),
      occasionId: nullable(text()),
      weekday: nullable(integer()),
      localDate: nullable(text()),
      maxOrders: integer(),
    },
    { sequelize, tableName: 'day_caps' },
  );
}
