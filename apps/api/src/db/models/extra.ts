import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { instant, integer, nullable, oneOf, text, withDefault } from '../columns.ts';

export const extraKinds = ['candles', 'knife', 'topper', 'other'] as const;
export type ExtraKind = (typeof extraKinds)[number];

/** Candles, a knife, a topper: sold beside the cake. Prices are in the price book. */
export class Extra extends Model<InferAttributes<Extra>, InferCreationAttributes<Extra>> {
  declare id: string;
  declare name: string;
  declare blurb: CreationOptional<string>;
  declare kind: ExtraKind;
  declare costMinor: CreationOptional<number>;
  declare taxCategory: string;
  declare position: CreationOptional<number>;
  declare archivedAt: Date | null;
}

export function initExtra(sequelize: Sequelize): void {
  Extra.init(
    {
      id: { ...text(), primaryKey: true },
      name: text(),
      blurb: withDefault(text(), ''),
      kind: oneOf(extraKinds),
      costMinor: withDefault(integer(), 0),
      taxCategory: text(),
      position: withDefault(integer(), 0),
      archivedAt: nullable(instant('archivedAt')),
    },
    { sequelize, tableName: 'extras' },
  );
}
