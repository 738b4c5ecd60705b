import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { key, text, writtenAt } from '../columns.ts';

/** What was said and settled about a stop that no declared allergy stands behind. */
export class StopTalk extends Model<InferAttributes<StopTalk>, InferCreationAttributes<StopTalk>> {
  declare id: CreationOptional<string>;
  declare orderId: string;
  declare revisionId: string;
  declare code: string;
  declare about: string;
  declare text: string;
  declare byUserId: string;
  declare at: CreationOptional<Date>;
}

export function initStopTalk(sequelize: Sequelize): void {
  StopTalk.init(
    {
      id: key(),
      orderId: text(),
      revisionId: text(),
      code: text(),
      about: text(),
      text: text(),
      byUserId: text(),
      at: writtenAt('at'),
    },
    { sequelize, tableName: 'stop_talks' },
  );
}
