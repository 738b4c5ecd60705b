import { Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize';
import { integer, text } from '../columns.ts';

/** The palette of a cake. */
export class ItemColour extends Model<
  InferAttributes<ItemColour>,
  InferCreationAttributes<ItemColour>
> {
  declare itemId: string;
  declare position: number;
  declare hex: string;
}

export function initItemColour(sequelize: Sequelize): void {
  ItemColour.init(
    {
      itemId: { ...text(), primaryKey: true },
      position: { ...integer(), primaryKey: true },
      hex: text(),
    },
    { sequelize, tableName: 'item_colours' },
  );
}
