import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { allergenIds } from '#shared/contracts/vocabulary.ts';
import type { AllergenId } from '#shared/contracts/vocabulary.ts';
import { flag, nullable, oneOf, text, withDefault } from '../columns.ts';

/** What the owner adds to "also handled in this kitchen", and the risk assessment "may contain" needs. */
export class KitchenAllergen extends Model<
  InferAttributes<KitchenAllergen>,
  InferCreationAttributes<KitchenAllergen>
> {
  declare allergen: AllergenId;
  declare handled: CreationOptional<boolean>;
  declare assessment: string | null;
  declare assessedOn: string | null;
}

export function initKitchenAllergen(sequelize: Sequelize): void {
  KitchenAllergen.init(
    {
      allergen: { ...oneOf(allergenIds), primaryKey: true },
      handled: withDefault(flag('handled'), false),
      assessment: nullable(text()),
      assessedOn: nullable(text()),
    },
    { sequelize, tableName: 'kitchen_allergens' },
  );
}
