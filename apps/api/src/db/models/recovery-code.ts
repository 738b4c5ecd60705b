import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { instant, key, nullable, text, writtenAt } from '../columns.ts';

/** A way in without the second factor, once. */
export class RecoveryCode extends Model<
  InferAttributes<RecoveryCode>,
  InferCreationAttributes<RecoveryCode>
> {
  declare id: CreationOptional<string>;
  declare userId: string;
  declare hash: string;
  declare createdAt: CreationOptional<Date>;
  declare usedAt: Date | null;
}

export function initRecoveryCode(sequelize: Sequelize): void {
  RecoveryCode.init(
    {
      id: key(),
      userId: text(),
      hash: text(),
      createdAt: writtenAt('createdAt'),
      usedAt: nullable(instant('usedAt')),
    },
    { sequelize, tableName: 'recovery_codes' },
  );
}
