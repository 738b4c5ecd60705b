import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { text, writtenAt } from '../columns.ts';

/** Seeders that have run. */
export class AppliedSeeder extends Model<
  InferAttributes<AppliedSeeder>,
  InferCreationAttributes<AppliedSeeder>
> {
  declare name: string;
  declare at: CreationOptional<Date>;
}

export function initAppliedSeeder(sequelize: Sequelize): void {
  AppliedSeeder.init(
    {
      name: { ...text(), primaryKey: true },
      at: writtenAt('at'),
    },
    { sequelize, tableName: 'applied_seeders' },
  );
}
