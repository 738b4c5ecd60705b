import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { allergenIds, severities } from '#shared/contracts/vocabulary.ts';
import type { AllergenId, Severity } from '#shared/contracts/vocabulary.ts';
import { instant, integer, key, nullable, oneOf, text, withDefault } from '../columns.ts';
import type { User } from './user.ts';

/** Health data: what a guest cannot eat, and what was settled about it. */
export class DeclaredAllergy extends Model<
  InferAttributes<DeclaredAllergy>,
  InferCreationAttributes<DeclaredAllergy>
> {
  declare id: CreationOptional<string>;
  declare revisionId: string;
  declare position: number;
  declare allergen: AllergenId | null;
  declare species: string | null;
  declare freeText: CreationOptional<string>;
  declare severity: Severity;
  declare guests: number;
  /** What was said and settled. */
  declare answer: string | null;
  declare answeredAt: Date | null;
  declare answeredByUserId: string | null;
  declare erasedAt: Date | null;

  declare answeredBy?: NonAttribute<User | null>;
}

export function initDeclaredAllergy(sequelize: Sequelize): void {
  DeclaredAllergy.init(
    {
      id: key(),
      revisionId: text(),
      position: integer(),
      allergen: nullable(oneOf(allergenIds)),
      species: nullable(text()),
      freeText: withDefault(text(), ''),
      severity: oneOf(severities),
      guests: integer(),
      answer: nullable(text()),
      answeredAt: nullable(instant('answeredAt')),
      answeredByUserId: nullable(text()),
      erasedAt: nullable(instant('erasedAt')),
    },
    { sequelize, tableName: 'declared_allergies' },
  );
}
