import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { instant, key, nullable, text, writtenAt } from '../columns.ts';

/** A stop the owner lifted with a written reason, which the customer reads and accepts. */
export class LiftedStop extends Model<
  InferAttributes<LiftedStop>,
  InferCreationAttributes<LiftedStop>
> {
  declare id: CreationOptional<string>;
  declare orderId: string;
  declare revisionId: string;
  declare code: string;
  declare about: string;
  declare reason: string;
  declare liftedByUserId: string;
  declare liftedAt: CreationOptional<Date>;
  declare acceptedAt: Date | null;
}

export function initLiftedStop(sequelize: Sequelize): void {
  LiftedStop.init(
    {
      id: key(),
      orderId: text(),
      revisionId: text(),
      code: text(),
      about: text(),
      reason: text(),
      liftedByUserId: text(),
      liftedAt: writtenAt('liftedAt'),
      acceptedAt: nullable(instant('acceptedAt')),
    },
    { sequelize, tableName: 'lifted_stops' },
  );
}
