import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { coveringIds, finishIds, shape, styleIds } from '#shared/contracts/vocabulary.ts';
import type { CoveringId, FinishId, Shape, StyleId } from '#shared/contracts/vocabulary.ts';
import { flag, integer, key, nullable, oneOf, text, withDefault } from '../columns.ts';

/** The body of a cake from the board up; a sheet, a cutting cake and pieces have one. */
export class ItemTier extends Model<InferAttributes<ItemTier>, InferCreationAttributes<ItemTier>> {
  declare id: CreationOptional<string>;
  declare itemId: string;
  /** 0 stands on the board. */
  declare position: number;
  declare shape: Shape;
  declare widthMm: number;
  declare depthMm: number;
  declare heightMm: number;
  declare layers: number;
  declare real: CreationOptional<boolean>;
  declare keepsake: CreationOptional<boolean>;
  declare spongeId: string | null;
  declare fillingId: string | null;
  declare coveringId: CoveringId | null;
  declare styleId: StyleId | null;
  declare finishId: FinishId | null;
  declare colourHex: string | null;
  /** Differs from the cake's. */
  declare ownCoating: CreationOptional<boolean>;
  declare words: string | null;
  declare wordsColourHex: string | null;
}

export function initItemTier(sequelize: Sequelize): void {
  ItemTier.init(
    {
      id: key(),
      itemId: text(),
      position: integer(),
      shape: oneOf(shape.options),
      widthMm: integer(),
      depthMm: integer(),
      heightMm: integer(),
      layers: integer(),
      real: withDefault(flag('real'), true),
      keepsake: withDefault(flag('keepsake'), false),
      spongeId: nullable(text()),
      fillingId: nullable(text()),
      coveringId: nullable(oneOf(coveringIds)),
      styleId: nullable(oneOf(styleIds)),
      finishId: nullable(oneOf(finishIds)),
      colourHex: nullable(text()),
      ownCoating: withDefault(flag('ownCoating'), false),
      words: nullable(text()),
      wordsColourHex: nullable(text()),
    },
    { sequelize, tableName: 'item_tiers' },
  );
}
