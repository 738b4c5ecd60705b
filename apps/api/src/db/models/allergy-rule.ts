import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { allergenIds, severities } from '#shared/contracts/vocabulary.ts';
import type { AllergenId, Severity } from '#shared/contracts/vocabulary.ts';
import { key, nullable, oneOf } from '../columns.ts';

export const allergyAnswers = ['take', 'talk', 'refuse'] as const;
export type AllergyAnswer = (typeof allergyAnswers)[number];

/** The owner's word per allergen (null: any not listed) and severity when a cake contains it. */
export class AllergyRule extends Model<
  InferAttributes<AllergyRule>,
  InferCreationAttributes<AllergyRule>
> {
  declare id: CreationOptional<string>;
  declare allergen: AllergenId | null;
  declare severity: Severity;
  declare answer: AllergyAnswer;
}

export function initAllergyRule(sequelize: Sequelize): void {
  AllergyRule.init(
    {
      id: key(),
      allergen: nullable(oneOf(allergenIds)),
      severity: oneOf(severities),
      answer: oneOf(allergyAnswers),
    },
    { sequelize, tableName: 'allergy_rules' },
  );
}
