import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { instant, key, nullable, text, writtenAt } from '../columns.ts';
import type { Order } from './order.ts';

/** A browser that showed an order's private key; the cookie's value, hashed. */
export class OrderAccess extends Model<
  InferAttributes<OrderAccess>,
  InferCreationAttributes<OrderAccess>
> {
  declare id: CreationOptional<string>;
  declare orderId: string;
  declare hash: string;
  declare createdAt: CreationOptional<Date>;
  declare expiresAt: Date;
  declare revokedAt: Date | null;

  declare order?: NonAttribute<Order>;
}

export function initOrderAccess(sequelize: Sequelize): void {
  OrderAccess.init(
    {
      id: key(),
      orderId: text(),
      hash: text(),
      createdAt: writtenAt('createdAt'),
      expiresAt: instant('expiresAt'),
      revokedAt: nullable(instant('revokedAt')),
    },
    { sequelize, tableName: 'order_access' },
  );
}
