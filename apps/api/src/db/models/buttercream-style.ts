import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { detail, styleIds } from '#shared/contracts/vocabulary.ts';
import type { Detail, StyleId } from '#shared/contracts/vocabulary.ts';
import { flag, instant, integer, nullable, oneOf, text, withDefault } from '../columns.ts';
import type { Formula } from './formula.ts';

/** One of the six buttercreams; what it holds and its colour come from its formula. */
export class ButtercreamStyle extends Model<
  InferAttributes<ButtercreamStyle>,
  InferCreationAttributes<ButtercreamStyle>
> {
  declare id: StyleId;
  declare name: string;
  declare blurb: CreationOptional<string>;
  declare how: CreationOptional<string>;
  declare bestFor: CreationOptional<string>;
  declare formulaId: string;
  declare sweetness: number;
  declare smoothness: number;
  declare detail: Detail;
  declare crusts: CreationOptional<boolean>;
  declare position: CreationOptional<number>;
  declare archivedAt: Date | null;

  declare formula?: NonAttribute<Formula>;
}

export function initButtercreamStyle(sequelize: Sequelize): void {
  ButtercreamStyle.init(
    {
      id: { ...oneOf(styleIds), primaryKey: true },
      name: text(),
      blurb: withDefault(text(), ''),
      how: withDefault(text(), ''),
      bestFor: withDefault(text(), ''),
      formulaId: text(),
      sweetness: integer(),
      smoothness: integer(),
      detail: oneOf(detail.options),
      crusts: withDefault(flag('crusts'), false),
      position: withDefault(integer(), 0),
      archivedAt: nullable(instant('archivedAt')),
    },
    { sequelize, tableName: 'buttercream_styles' },
  );
}
