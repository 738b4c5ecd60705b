import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { instant, integer, nullable, oneOf, text, withDefault, writtenAt } from '../columns.ts';
import type { IngredientAllergen } from './ingredient-allergen.ts';
import type { IngredientMeasure } from './ingredient-measure.ts';

export const ingredientFamilies = [
  'flour',
  'sugar',
  'butter',
  'fat',
  'egg',
  'dairy',
  'raising',
  'starch',
  'fruit',
  'nut',
  'chocolate',
  'flavour',
  'colour',
  'gelling',
  'salt',
  'liquid',
  'other',
] as const;
export type IngredientFamily = (typeof ingredientFamilies)[number];

export const eggParts = ['whole', 'white', 'yolk'] as const;
export type EggPart = (typeof eggParts)[number];

export const triStates = ['yes', 'no', 'unknown'] as const;
export type TriState = (typeof triStates)[number];

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
  declare pasteurised: CreationOptional<TriState>;
  declare gelatine: CreationOptional<TriState>;
  declare alcohol: CreationOptional<TriState>;
  declare cochineal: CreationOptional<TriState>;
  /** Of meat, fish or slaughter. */
  declare animalOrigin: CreationOptional<TriState>;
  declare honey: CreationOptional<TriState>;
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
      family: oneOf(ingredientFamilies),
      packMg: nullable(integer()),
      packPriceMinor: nullable(integer()),
      densityMgPerMl: nullable(integer()),
      roundingMg: withDefault(integer(), 1000),
      eggPart: nullable(oneOf(eggParts)),
      pasteurised: withDefault(oneOf(triStates), 'unknown'),
      gelatine: withDefault(oneOf(triStates), 'unknown'),
      alcohol: withDefault(oneOf(triStates), 'unknown'),
      cochineal: withDefault(oneOf(triStates), 'unknown'),
      animalOrigin: withDefault(oneOf(triStates), 'unknown'),
      honey: withDefault(oneOf(triStates), 'unknown'),
      handledNote: nullable(text()),
      createdAt: writtenAt('createdAt'),
      archivedAt: nullable(instant('archivedAt')),
    },
    { sequelize, tableName: 'ingredients' },
  );
}
