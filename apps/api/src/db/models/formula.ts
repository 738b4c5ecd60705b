import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { formulaKinds } from '#shared/contracts/pantry.ts';
import type { FormulaKind } from '#shared/contracts/pantry.ts';
import { instant, nullable, oneOf, text, writtenAt } from '../columns.ts';
import type { FormulaVersion } from './formula-version.ts';

/** A recipe by weight; what it says is in its versions. */
export class Formula extends Model<InferAttributes<Formula>, InferCreationAttributes<Formula>> {
  declare id: string;
  declare kind: FormulaKind;
  declare name: string;
  declare currentVersionId: string | null;
  declare createdAt: CreationOptional<Date>;
  declare archivedAt: Date | null;

  declare currentVersion?: NonAttribute<FormulaVersion | null>;
  declare versions?: NonAttribute<FormulaVersion[]>;
}

export function initFormula(sequelize: Sequelize): void {
  Formula.init(
    {
      id: { ...text(), primaryKey: true },
      kind: oneOf(formulaKinds),
      name: text(),
      currentVersionId: nullable(text()),
      createdAt: writtenAt('createdAt'),
      archivedAt: nullable(instant('archivedAt')),
    },
    { sequelize, tableName: 'formulas' },
  );
}
