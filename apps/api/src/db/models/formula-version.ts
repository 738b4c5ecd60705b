import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { flag, integer, key, nullable, real, text, withDefault, writtenAt } from '../columns.ts';
import type { Formula } from './formula.ts';
import type { FormulaLine } from './formula-line.ts';
import type { FormulaStep } from './formula-step.ts';

/** A formula as it stood; an order keeps the version it was made with. */
export class FormulaVersion extends Model<
  InferAttributes<FormulaVersion>,
  InferCreationAttributes<FormulaVersion>
> {
  declare id: CreationOptional<string>;
  declare formulaId: string;
  declare n: number;
  /** What is left of what goes in. */
  declare yieldPpm: number;
  declare densityMgPerMl: number;
  declare bakeLossPpm: CreationOptional<number>;
  declare baseColourHex: string | null;
  declare keepsRoomHours: number | null;
  declare keepsChilledHours: number | null;
  declare keepsFrozenHours: number | null;
  /** Warmest it holds its shape for about two hours. */
  declare holdsToC: number | null;
  declare refrigerate: CreationOptional<boolean>;
  /** Made with pasteurised egg unless somebody decides otherwise. */
  declare pasteurisedByDefault: CreationOptional<boolean>;
  declare note: CreationOptional<string>;
  declare createdAt: CreationOptional<Date>;
  declare createdByUserId: string | null;

  declare formula?: NonAttribute<Formula>;
  declare lines?: NonAttribute<FormulaLine[]>;
  declare steps?: NonAttribute<FormulaStep[]>;
}

export function initFormulaVersion(sequelize: Sequelize): void {
  FormulaVersion.init(
    {
      id: key(),
      formulaId: text(),
      n: integer(),
      yieldPpm: integer(),
      densityMgPerMl: integer(),
      bakeLossPpm: withDefault(integer(), 0),
      baseColourHex: nullable(text()),
      keepsRoomHours: nullable(integer()),
      keepsChilledHours: nullable(integer()),
      keepsFrozenHours: nullable(integer()),
      holdsToC: nullable(real()),
      refrigerate: withDefault(flag('refrigerate'), true),
      pasteurisedByDefault: withDefault(flag('pasteurisedByDefault'), false),
      note: withDefault(text(), ''),
      createdAt: writtenAt('createdAt'),
      createdByUserId: nullable(text()),
    },
    { sequelize, tableName: 'formula_versions' },
  );
}
