import { Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize';
import { dietIds } from '#shared/contracts/vocabulary.ts';
import type { DietId } from '#shared/contracts/vocabulary.ts';
import { oneOf, text } from '../columns.ts';

/** A diet at the table. */
export class DeclaredDiet extends Model<
  InferAttributes<DeclaredDiet>,
  InferCreationAttributes<DeclaredDiet>
> {
  declare revisionId: string;
  declare diet: DietId;
}

export function initDeclaredDiet(sequelize: Sequelize): void {
  DeclaredDiet.init(
    {
      revisionId: { ...text(), primaryKey: true },
      diet: { ...oneOf(dietIds), primaryKey: true },
    },
    { sequelize, tableName: 'declared_diets' },
  );
}
