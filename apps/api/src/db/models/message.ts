import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { instant, key, nullable, oneOf, text, withDefault, writtenAt } from '../columns.ts';
import type { User } from './user.ts';

export const messageSenders = ['customer', 'studio', 'system'] as const;
export type MessageSender = (typeof messageSenders)[number];

/** One message between customer and studio. Blanked when erased. */
export class Message extends Model<InferAttributes<Message>, InferCreationAttributes<Message>> {
  declare id: CreationOptional<string>;
  declare orderId: string;
  declare sender: MessageSender;
  declare authorUserId: string | null;
  declare authorName: CreationOptional<string>;
  declare body: string;
  declare createdAt: CreationOptional<Date>;
  /** By the other side. */
  declare readAt: Date | null;
  declare erasedAt: Date | null;

  declare author?: NonAttribute<User | null>;
}

export function initMessage(sequelize: Sequelize): void {
  Message.init(
    {
      id: key(),
      orderId: text(),
      sender: oneOf(messageSenders),
      authorUserId: nullable(text()),
      authorName: withDefault(text(), ''),
      body: text(),
      createdAt: writtenAt('createdAt'),
      readAt: nullable(instant('readAt')),
      erasedAt: nullable(instant('erasedAt')),
    },
    { sequelize, tableName: 'messages' },
  );
}
