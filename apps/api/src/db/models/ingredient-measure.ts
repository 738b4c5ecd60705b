import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { householdMeasures } from '#shared/contracts/pantry.ts';
import type { HouseholdMeasure } from '#shared/contracts/pantry.ts';
import { integer, key, nullable, oneOf, text } from '../columns.ts';

/** Weight of a household measure of a product; each stored, since measures do not multiply through. */
export class IngredientMeasure extends Model<
  InferAttributes<IngredientMeasure>,
  InferCreationAttributes<IngredientMeasure>
> {
  declare id: CreationOptional<string>;
  declare ingredientId: string;
  declare measure: HouseholdMeasure;
  /** Packed, sifted. */
  declare qualifier: string | null;
  declare weightMg: number;
  declare source: string | null;
}

export function initIngredientMeasure(sequelize: Sequelize): void {
  IngredientMeasure.init(
    {
      id: key(),
      ingredientId: text(),
      measure: oneOf(householdMeasures),
      qualifier: nullable(text()),
      weightMg: integer(),
      source: nullable(text()),
    },
    { sequelize, tableName: 'ingredient_measures' },
  );
}
