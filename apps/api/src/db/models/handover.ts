import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { instant, key, nullable, text, withDefault, writtenAt } from '../columns.ts';
import type { Photo } from './photo.ts';
import type { User } from './user.ts';

/** Who collected a cake, when, and in what condition. */
export class Handover extends Model<InferAttributes<Handover>, InferCreationAttributes<Handover>> {
  declare id: CreationOptional<string>;
  declare orderId: string;
  declare collectedBy: string;
  declare condition: CreationOptional<string>;
  declare photoId: string | null;
  declare at: CreationOptional<Date>;
  declare byUserId: string;
  declare erasedAt: Date | null;

  declare photo?: NonAttribute<Photo | null>;
  declare byUser?: NonAttribute<User>;
}

export function initHandover(sequelize: Sequelize): void {
  Handover.init(
    {
      id: key(),
      orderId: text(),
      collectedBy: text(),
      condition: withDefault(text(), ''),
      photoId: nullable(text()),
      at: writtenAt('at'),
      byUserId: text(),
      erasedAt: nullable(instant('erasedAt')),
    },
    { sequelize, tableName: 'handovers' },
  );
}
