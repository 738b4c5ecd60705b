import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { instant, integer, nullable, text, withDefault } from '../columns.ts';

/** A sheet cake the studio bakes, with the size of one cut piece. */
export class SheetSize extends Model<
  InferAttributes<SheetSize>,
  InferCreationAttributes<SheetSize>
> {
  declare id: string;
  declare name: string;
  declare widthMm: number;
  declare depthMm: number;
  declare heightMm: number;
  declare cutWidthMm: CreationOptional<number>;
  declare cutDepthMm: CreationOptional<number>;
  declare position: CreationOptional<number>;
  declare archivedAt: Date | null;
}

export function initSheetSize(sequelize: Sequelize): void {
  SheetSize.init(
    {
      id: { ...text(), primaryKey: true },
      name: text(),
      widthMm: integer(),
      depthMm: integer(),
      heightMm: integer(),
      cutWidthMm: withDefault(integer(), 50),
      cutDepthMm: withDefault(integer(), 50),
      position: withDefault(integer(), 0),
      archivedAt: nullable(instant('archivedAt')),
    },
    { sequelize, tableName: 'sheet_sizes' },
  );
}
