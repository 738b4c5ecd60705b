import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { flag, instant, integer, nullable, text, withDefault } from '../columns.ts';
import type { Formula } from './formula.ts';

/** A filling on the menu. */
export class Filling extends Model<InferAttributes<Filling>, InferCreationAttributes<Filling>> {
  declare id: string;
  declare name: string;
  declare blurb: CreationOptional<string>;
  declare formulaId: string;
  declare colourHex: string;
  declare thicknessUm: CreationOptional<number>;
  /** Needs a dam of frosting. */
  declare soft: CreationOptional<boolean>;
  declare position: CreationOptional<number>;
  declare archivedAt: Date | null;

  declare formula?: NonAttribute<Formula>;
}

export function initFilling(sequelize: Sequelize): void {
  Filling.init(
    {
      id: { ...text(), primaryKey: true },
      name: text(),
      blurb: withDefault(text(), ''),
      formulaId: text(),
      colourHex: text(),
      thicknessUm: withDefault(integer(), 6000),
      soft: withDefault(flag('soft'), false),
      position: withDefault(integer(), 0),
      archivedAt: nullable(instant('archivedAt')),
    },
    { sequelize, tableName: 'fillings' },
  );
}
