import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { flag, integer, key, text, withDefault } from '../columns.ts';

/** Units of fridge space of one size. */
export class ColdPlace extends Model<
  InferAttributes<ColdPlace>,
  InferCreationAttributes<ColdPlace>
> {
  declare id: CreationOptional<string>;
  declare name: string;
  declare widthMm: number;
  declare depthMm: number;
  declare heightMm: number;
  declare places: number;
  declare active: CreationOptional<boolean>;
}

export function initColdPlace(sequelize: Sequelize): void {
  ColdPlace.init(
    {
      id: key(),
      name: text(),
      widthMm: integer(),
      depthMm: integer(),
      heightMm: integer(),
      places: integer(),
      active: withDefault(flag('active'), true),
    },
    { sequelize, tableName: 'cold_places' },
  );
}
