import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { coveringIds, detail } from '#shared/contracts/vocabulary.ts';
import type { CoveringId, Detail } from '#shared/contracts/vocabulary.ts';
import { instant, integer, nullable, oneOf, real, text, withDefault } from '../columns.ts';
import type { CoveringFinish } from './covering-finish.ts';
import type { Formula } from './formula.ts';

/** What goes over a cake. Fondant, ganache have a formula of their own; buttercream and semi-naked take their style's. */
export class Covering extends Model<InferAttributes<Covering>, InferCreationAttributes<Covering>> {
  declare id: CoveringId;
  declare name: string;
  declare blurb: CreationOptional<string>;
  declare formulaId: string | null;
  declare colourHex: string;
  /** Of the buttercream under it. */
  declare crumbCoatUm: number;
  /** Of the covering itself. */
  declare finalCoatUm: number;
  /** Null takes the style's. */
  declare holdsToC: number | null;
  declare detail: Detail;
  declare position: CreationOptional<number>;
  declare archivedAt: Date | null;

  declare formula?: NonAttribute<Formula | null>;
  declare coveringFinishes?: NonAttribute<CoveringFinish[]>;
}

export function initCovering(sequelize: Sequelize): void {
  Covering.init(
    {
      id: { ...oneOf(coveringIds), primaryKey: true },
      name: text(),
      blurb: withDefault(text(), ''),
      formulaId: nullable(text()),
      colourHex: text(),
      crumbCoatUm: integer(),
      finalCoatUm: integer(),
      holdsToC: nullable(real()),
      detail: oneOf(detail.options),
      position: withDefault(integer(), 0),
      archivedAt: nullable(instant('archivedAt')),
    },
    { sequelize, tableName: 'coverings' },
  );
}
