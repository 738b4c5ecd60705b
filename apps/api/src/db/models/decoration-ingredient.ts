import { Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, NonAttribute, Sequelize } from 'sequelize';
import { integer, text } from '../columns.ts';
import type { Ingredient } from './ingredient.ts';

/** Bought products a decoration is made of, per piece. */
export class DecorationIngredient extends Model<
  InferAttributes<DecorationIngredient>,
  InferCreationAttributes<DecorationIngredient>
> {
  declare decorationId: string;
  declare ingredientId: string;
  declare weightMg: number;

  declare ingredient?: NonAttribute<Ingredient>;
}

export function initDecorationIngredient(sequelize: Sequelize): void {
  DecorationIngredient.init(
    {
      decorationId: { ...text(), primaryKey: true },
      ingredientId: { ...text(), primaryKey: true },
      weightMg: integer(),
    },
    { sequelize, tableName: 'decoration_ingredients' },
  );
}
