import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { stepResources } from '#shared/contracts/pantry.ts';
import type { StepResource } from '#shared/contracts/pantry.ts';
import { integer, key, nullable, oneOf, real, text, withDefault } from '../columns.ts';

/** One step of a formula, with what it takes and what must be measured. */
export class FormulaStep extends Model<
  InferAttributes<FormulaStep>,
  InferCreationAttributes<FormulaStep>
> {
  declare id: CreationOptional<string>;
  declare versionId: string;
  declare position: number;
  declare text: string;
  declare activeMinutes: CreationOptional<number>;
  declare waitingMinutes: CreationOptional<number>;
  declare resource: StepResource;
  /** Must be reached, measured with a probe. */
  declare criticalLimitC: number | null;
  declare criticalSeconds: number | null;
  declare criticalNote: string | null;
  /** At sea level; the bench shows it for the studio's altitude. */
  declare syrupTargetC: number | null;
}

export function initFormulaStep(sequelize: Sequelize): void {
  FormulaStep.init(
    {
      id: key(),
      versionId: text(),
      position: integer(),
      text: text(),
      activeMinutes: withDefault(integer(), 0),
      waitingMinutes: withDefault(integer(), 0),
      resource: oneOf(stepResources),
      criticalLimitC: nullable(real()),
      criticalSeconds: nullable(integer()),
      criticalNote: nullable(text()),
      syrupTargetC: nullable(real()),
    },
    { sequelize, tableName: 'formula_steps' },
  );
}
