import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { decorationSource } from '#shared/contracts/vocabulary.ts';
import type { DecorationSource } from '#shared/contracts/vocabulary.ts';
import { integer, key, nullable, oneOf, text, withDefault } from '../columns.ts';
import type { Decoration } from './decoration.ts';

/** A decoration on one tier, or on the whole cake. */
export class ItemDecoration extends Model<
  InferAttributes<ItemDecoration>,
  InferCreationAttributes<ItemDecoration>
> {
  declare id: CreationOptional<string>;
  declare itemId: string;
  declare position: number;
  declare decorationId: string;
  declare tierPosition: number | null;
  declare quantity: number;
  declare colourHex: string | null;
  declare source: DecorationSource;
  declare note: CreationOptional<string>;

  declare decoration?: NonAttribute<Decoration>;
}

export function initItemDecoration(sequelize: Sequelize): void {
  ItemDecoration.init(
    {
      id: key(),
      itemId: text(),
      position: integer(),
      decorationId: text(),
      tierPosition: nullable(integer()),
      quantity: integer(),
      colourHex: nullable(text()),
      source: oneOf(decorationSource.options),
      note: withDefault(text(), ''),
    },
    { sequelize, tableName: 'item_decorations' },
  );
}
