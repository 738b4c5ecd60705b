import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { instant, integer, nullable, text, withDefault } from '../columns.ts';

/** Footprint of one cut serving at full tier height. */
export class PortionSize extends Model<
  InferAttributes<PortionSize>,
  InferCreationAttributes<PortionSize>
> {
  declare id: string;
  declare name: string;
  declare blurb: CreationOptional<string>;
  declare widthMm: number;
  declare depthMm: number;
  declare position: CreationOptional<number>;
  declare archivedAt: Date | null;
}

export function initPortionSize(sequelize: Sequelize): void {
  PortionSize.init(
    {
      id: { ...text(), primaryKey: true },
      name: text(),
      blurb: withDefault(text(), ''),
      widthMm: integer(),
      depthMm: integer(),
      position: withDefault(integer(), 0),
      archivedAt: nullable(instant('archivedAt')),
    },
    { sequelize, tableName: 'portion_sizes' },
  );
}
