import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { allergenIds, allergenState } from '#shared/contracts/vocabulary.ts';
import type { AllergenId, AllergenState } from '#shared/contracts/vocabulary.ts';
import { key, nullable, oneOf, text } from '../columns.ts';

/** What a product's label says of one allergen (and species, for nuts and cereals). */
export class IngredientAllergen extends Model<
  InferAttributes<IngredientAllergen>,
  InferCreationAttributes<IngredientAllergen>
> {
  declare id: CreationOptional<string>;
  declare ingredientId: string;
  declare allergen: AllergenId;
  declare species: string | null;
  declare state: AllergenState;
}

export function initIngredientAllergen(sequelize: Sequelize): void {
  IngredientAllergen.init(
    {
      id: key(),
      ingredientId: text(),
      allergen: oneOf(allergenIds),
      species: nullable(text()),
      state: oneOf(allergenState.options),
    },
    { sequelize, tableName: 'ingredient_allergens' },
  );
}
