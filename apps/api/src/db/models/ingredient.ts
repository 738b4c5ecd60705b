import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { eggPart, ingredientFamily, labelFact } from '#shared/contracts/pantry.ts';
import type { EggPart, IngredientFamily } from '#shared/contracts/pantry.ts';
import type { LabelFact } from '#shared/kitchen/derive-contents.ts';
import { instant, integer, nullable, oneOf, text, withDefault, writtenAt } from '../columns.ts';
import type { IngredientAllergen } from './ingredient-allergen.ts';
import type { IngredientMeasure } from './ingredient-measure.ts';

/** A product as bought. What its label does not settle is unknown, never none. */
export class Ingredient extends Model<
  InferAttributes<Ingredient>,
  InferCreationAttributes<Ingredient>
> {
  declare id: string;
  declare name: string;
  declare brand: string | null;
  /** As printed in a statement of ingredients. */
  declare labelName: string;
  /** What a compound ingredient is made of, for the statement. */
  declare labelContents: string | null;
  declare labelCheckedOn: string | null;
  declare family: IngredientFamily;
  declare packMg: number | null;
  declare packPriceMinor: number | null;
  declare densityMgPerMl: number | null;
  /** Kitchen-sensible step when a formula is scaled. */
  declare roundingMg: CreationOptional<number>;
  declare eggPart: EggPart | null;
  declare pasteurised: CreationOptional<LabelFact>;
  declare gelatine: CreationOptional<LabelFact>;
  declare alcohol: CreationOptional<LabelFact>;
  declare cochineal: CreationOptional<LabelFact>;
  /** Of meat, fish or slaughter. */
  declare animalOrigin: CreationOptional<LabelFact>;
  declare honey: CreationOptional<LabelFact>;
  declare handledNote: string | null;
  declare createdAt: CreationOptional<Date>;
  declare archivedAt: Date | null;

  declare allergens?: NonAttribute<IngredientAllergen[]>;
  declare measures?: NonAttribute<IngredientMeasure[]>;
}

export function initIngredient(sequelize: Sequelize): void {
  Ingredient.init(
    {
      id: { ...text(), primaryKey: true },
      name: text(),
      brand: nullable(text()),
      labelName: text(),
      labelContents: nullable(text()),
      labelCheckedOn: nullable(text()),
      family: oneOf(ingredientFamily.options),
      packMg: nullable(integer()),
      packPriceMinor: nullable(integer()),
      densityMgPerMl: nullable(integer()),
      roundingMg: withDefault(integer(), 1000),
      eggPart: nullable(oneOf(eggPart.options)),
      pasteurised: withDefault(oneOf(labelFact.options), 'unknown'),
      gelatine: withDefault(oneOf(labelFact.options), 'unknown'),
      alcohol: withDefault(oneOf(labelFact.options), 'unknown'),
      cochineal: withDefault(oneOf(labelFact.options), 'unknown'),
      animalOrigin: withDefault(oneOf(labelFact.options), 'unknown'),
      honey: withDefault(oneOf(labelFact.options), 'unknown'),
      handledNote: nullable(text()),
      createdAt: writtenAt('createdAt'),
      archivedAt: nullable(instant('archivedAt')),
    },
    { sequelize, tableName: 'ingredients' },
  );
}
