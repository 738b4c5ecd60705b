import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { instant, integer, key, nullable, oneOf, text, writtenAt } from '../columns.ts';

export const policyKinds = ['privacy', 'terms', 'allergy', 'cancellation', 'photo'] as const;
export type PolicyKind = (typeof policyKinds)[number];

/** The text of a policy as it stood; never changed in place. */
export class PolicyVersion extends Model<
  InferAttributes<PolicyVersion>,
  InferCreationAttributes<PolicyVersion>
> {
  declare id: CreationOptional<string>;
  declare kind: PolicyKind;
  declare n: number;
  declare title: string;
  declare text: string;
  declare validFrom: Date;
  declare createdAt: CreationOptional<Date>;
  declare createdByUserId: string | null;
}

export function initPolicyVersion(sequelize: Sequelize): void {
  PolicyVersion.init(
    {
      id: key(),
      kind: oneOf(policyKinds),
      n: integer(),
      title: text(),
      text: text(),
      validFrom: instant('validFrom'),
      createdAt: writtenAt('createdAt'),
      createdByUserId: nullable(text()),
    },
    { sequelize, tableName: 'policy_versions' },
  );
}
