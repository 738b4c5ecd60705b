import { Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize';
import { text } from '../columns.ts';

/** The formulas a revision was worked out with. */
export class RevisionFormulaVersion extends Model<
  InferAttributes<RevisionFormulaVersion>,
  InferCreationAttributes<RevisionFormulaVersion>
> {
  declare revisionId: string;
  declare formulaVersionId: string;
}

export function initRevisionFormulaVersion(sequelize: Sequelize): void {
  RevisionFormulaVersion.init(
    {
      revisionId: { ...text(), primaryKey: true },
      formulaVersionId: { ...text(), primaryKey: true },
    },
    { sequelize, tableName: 'revision_formula_versions' },
  );
}
