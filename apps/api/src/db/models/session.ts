import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { instant, nullable, text, withDefault, writtenAt } from '../columns.ts';
import type { User } from './user.ts';

/** A signed-in (or anonymous) browser. The store writes sid, data and expires. */
export class Session extends Model<InferAttributes<Session>, InferCreationAttributes<Session>> {
  declare sid: string;
  declare userId: string | null;
  declare data: string;
  /** Idle limit. */
  declare expires: Date;
  declare absoluteExpiresAt: Date;
  declare createdAt: CreationOptional<Date>;
  declare lastSeenAt: CreationOptional<Date>;
  declare address: string | null;
  declare agent: CreationOptional<string>;

  declare user?: NonAttribute<User | null>;
}

export function initSession(sequelize: Sequelize): void {
  Session.init(
    {
      sid: { ...text(), primaryKey: true },
      userId: nullable(text()),
      data: text(),
      expires: instant('expires'),
      absoluteExpiresAt: instant('absoluteExpiresAt'),
      createdAt: writtenAt('createdAt'),
      lastSeenAt: writtenAt('lastSeenAt'),
      address: nullable(text()),
      agent: withDefault(text(), ''),
    },
    { sequelize, tableName: 'sessions' },
  );
}
