import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { integer, withDefault } from '../columns.ts';

/** Counters that tell what was worked out with what; always the row with id 1. */
export class PlanState extends Model<
  InferAttributes<PlanState>,
  InferCreationAttributes<PlanState>
> {
  declare id: CreationOptional<number>;
  declare planVersion: CreationOptional<number>;
  declare settingsVersion: CreationOptional<number>;
  declare catalogueVersion: CreationOptional<number>;
}

export function initPlanState(sequelize: Sequelize): void {
  PlanState.init(
    {
      id: { ...withDefault(integer(), 1), primaryKey: true },
      planVersion: withDefault(integer(), 0),
      settingsVersion: withDefault(integer(), 0),
      catalogueVersion: withDefault(integer(), 0),
    },
    { sequelize, tableName: 'plan_state' },
  );
}
