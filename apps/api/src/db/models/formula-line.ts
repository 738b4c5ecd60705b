import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { integer, key, nullable, text, withDefault } from '../columns.ts';
import type { FormulaVersion } from './formula-version.ts';
import type { Ingredient } from './ingredient.ts';

/** One line of a formula: a product or another formula. */
export class FormulaLine extends Model<
  InferAttributes<FormulaLine>,
  InferCreationAttributes<FormulaLine>
> {
  declare id: CreationOptional<string>;
  declare versionId: string;
  declare position: number;
  declare ingredientId: string | null;
  declare formulaVersionId: string | null;
  declare weightMg: number;
  declare asTyped: string | null;
  /** The step it goes in at, from 0. */
  declare step: CreationOptional<number>;

  declare ingredient?: NonAttribute<Ingredient | null>;
  declare formulaVersion?: NonAttribute<FormulaVersion | null>;
}

export function initFormulaLine(sequelize: Sequelize): void {
  FormulaLine.init(
    {
      id: key(),
      versionId: text(),
      position: integer(),
      ingredientId: nullable(text()),
      formulaVersionId: nullable(text()),
      weightMg: integer(),
      asTyped: nullable(text()),
      step: withDefault(integer(), 0),
    },
    { sequelize, tableName: 'formula_lines' },
  );
}
