import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { instant, integer, nullable, text, writtenAt } from '../columns.ts';

/** The answer to a request that was sent with a key; the same key twice is one request. */
export class IdempotencyKey extends Model<
  InferAttributes<IdempotencyKey>,
  InferCreationAttributes<IdempotencyKey>
> {
  declare scope: string;
  declare key: string;
  declare requestHash: string;
  declare status: number;
  /** As it was sent, JSON. */
  declare response: string;
  declare orderId: string | null;
  declare createdAt: CreationOptional<Date>;
  declare expiresAt: Date;
}

export function initIdempotencyKey(sequelize: Sequelize): void {
  IdempotencyKey.init(
    {
      scope: { ...text(), primaryKey: true },
      key: { ...text(), primaryKey: true },
      requestHash: text(),
      status: integer(),
      response: text(),
      orderId: nullable(text()),
      createdAt: writtenAt('createdAt'),
      expiresAt: instant('expiresAt'),
    },
    { sequelize, tableName: 'idempotency_keys' },
  );
}
