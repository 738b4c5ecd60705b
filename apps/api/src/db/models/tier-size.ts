import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { shape } from '#shared/contracts/vocabulary.ts';
import type { Shape } from '#shared/contracts/vocabulary.ts';
import { instant, integer, json, key, nullable, oneOf, withDefault } from '../columns.ts';
import { intList } from '../json-shapes.ts';

/** A tier the studio bakes. */
export class TierSize extends Model<InferAttributes<TierSize>, InferCreationAttributes<TierSize>> {
  declare id: CreationOptional<string>;
  declare shape: Shape;
  declare widthMm: number;
  declare depthMm: number;
  declare heightsMm: number[];
  declare position: CreationOptional<number>;
  declare archivedAt: Date | null;
}

export function initTierSize(sequelize: Sequelize): void {
  TierSize.init(
    {
      id: key(),
      shape: oneOf(shape.options),
      widthMm: integer(),
      depthMm: integer(),
      heightsMm: json('heightsMm', intList),
      position: withDefault(integer(), 0),
      archivedAt: nullable(instant('archivedAt')),
    },
    { sequelize, tableName: 'tier_sizes' },
  );
}
