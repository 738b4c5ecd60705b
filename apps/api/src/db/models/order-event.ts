import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { orderStatuses } from '#shared/contracts/vocabulary.ts';
import type { OrderStatus } from '#shared/contracts/vocabulary.ts';
import { integer, json, nullable, oneOf, text, writtenAt } from '../columns.ts';
import { idFacts } from '../json-shapes.ts';
import type { IdFacts } from '../json-shapes.ts';
import type { User } from './user.ts';

export const actorKinds = ['guest', 'customer', 'counter', 'baker', 'owner', 'system'] as const;
export type ActorKind = (typeof actorKinds)[number];

/** What happened to an order, ids only; refuses UPDATE and DELETE. */
export class OrderEvent extends Model<
  InferAttributes<OrderEvent>,
  InferCreationAttributes<OrderEvent>
> {
  declare orderId: string;
  declare seq: number;
  declare kind: string;
  declare actorKind: ActorKind;
  declare actorUserId: string | null;
  declare fromStatus: OrderStatus | null;
  declare toStatus: OrderStatus | null;
  declare data: IdFacts;
  declare at: CreationOptional<Date>;

  declare actor?: NonAttribute<User | null>;
}

export function initOrderEvent(sequelize: Sequelize): void {
  OrderEvent.init(
    {
      orderId: { ...text(), primaryKey: true },
      seq: { ...integer(), primaryKey: true },
      kind: text(),
      actorKind: oneOf(actorKinds),
      actorUserId: nullable(text()),
      fromStatus: nullable(oneOf(orderStatuses)),
      toStatus: nullable(oneOf(orderStatuses)),
      data: json('data', idFacts),
      at: writtenAt('at'),
    },
    { sequelize, tableName: 'order_events' },
  );
}
