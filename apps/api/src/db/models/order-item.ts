import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { integer, key, nullable, oneOf, text, withDefault } from '../columns.ts';
import type { Extra } from './extra.ts';
import type { ItemColour } from './item-colour.ts';
import type { ItemDecoration } from './item-decoration.ts';
import type { ItemTier } from './item-tier.ts';
import type { SheetSize } from './sheet-size.ts';

export const itemKinds = [
  'tiered',
  'sheet',
  'pieces',
  'cutting',
  'tasting-box',
  'stand',
  'extra',
] as const;
export type ItemKind = (typeof itemKinds)[number];

/** One item of a revision. Cakes (tiered, sheet, cutting) and pieces have tiers; stands and extras have none. */
export class OrderItem extends Model<
  InferAttributes<OrderItem>,
  InferCreationAttributes<OrderItem>
> {
  declare id: CreationOptional<string>;
  declare revisionId: string;
  declare position: number;
  declare kind: ItemKind;
  declare quantity: CreationOptional<number>;
  declare sheetSizeId: string | null;
  declare extraId: string | null;
  /** What staff call it where the catalogue has no name. */
  declare label: string | null;
  declare standDepositMinor: number | null;
  declare note: CreationOptional<string>;

  declare sheetSize?: NonAttribute<SheetSize | null>;
  declare extra?: NonAttribute<Extra | null>;
  declare tiers?: NonAttribute<ItemTier[]>;
  declare decorations?: NonAttribute<ItemDecoration[]>;
  declare colours?: NonAttribute<ItemColour[]>;
}

export function initOrderItem(sequelize: Sequelize): void {
  OrderItem.init(
    {
      id: key(),
      revisionId: text(),
      position: integer(),
      kind: oneOf(itemKinds),
      quantity: withDefault(integer(), 1),
      sheetSizeId: nullable(text()),
      extraId: nullable(text()),
      label: nullable(text()),
      standDepositMinor: nullable(integer()),
      note: withDefault(text(), ''),
    },
    { sequelize, tableName: 'order_items' },
  );
}
