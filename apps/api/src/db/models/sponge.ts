import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { instant, integer, nullable, text, withDefault } from '../columns.ts';
import type { Formula } from './formula.ts';

/** A sponge on the menu; weights and losses come from its formula. */
export class Sponge extends Model<InferAttributes<Sponge>, InferCreationAttributes<Sponge>> {
  declare id: string;
  declare name: string;
  declare blurb: CreationOptional<string>;
  declare formulaId: string;
  /** Cut away to level. */
  declare levellingPpm: CreationOptional<number>;
  declare colourHex: string;
  declare position: CreationOptional<number>;
  declare archivedAt: Date | null;

  declare formula?: NonAttribute<Formula>;
}

export function initSponge(sequelize: Sequelize): void {
  Sponge.init(
    {
      id: { ...text(), primaryKey: true },
      name: text(),
      blurb: withDefault(text(), ''),
      formulaId: text(),
      levellingPpm: withDefault(integer(), 80000),
      colourHex: text(),
      position: withDefault(integer(), 0),
      archivedAt: nullable(instant('archivedAt')),
    },
    { sequelize, tableName: 'sponges' },
  );
}
