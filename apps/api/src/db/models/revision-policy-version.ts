import { Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize';
import { text } from '../columns.ts';

/** The policies a revision was sent under. */
export class RevisionPolicyVersion extends Model<
  InferAttributes<RevisionPolicyVersion>,
  InferCreationAttributes<RevisionPolicyVersion>
> {
  declare revisionId: string;
  declare policyVersionId: string;
}

export function initRevisionPolicyVersion(sequelize: Sequelize): void {
  RevisionPolicyVersion.init(
    {
      revisionId: { ...text(), primaryKey: true },
      policyVersionId: { ...text(), primaryKey: true },
    },
    { sequelize, tableName: 'revision_policy_versions' },
  );
}
