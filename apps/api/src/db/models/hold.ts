import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { instant, key, nullable, oneOf, text, writtenAt } from '../columns.ts';
import type { Order } from './order.ts';

export const holdKinds = ['guest-link', 'answer', 'quote', 'deposit'] as const;
export type HoldKind = (typeof holdKinds)[number];

export const holdReleaseds = ['confirmed', 'ended', 'ran-out', 'replaced'] as const;
export type HoldReleased = (typeof holdReleaseds)[number];

/** A place in the plan kept for an order that is not confirmed. */
export class Hold extends Model<InferAttributes<Hold>, InferCreationAttributes<Hold>> {
  declare id: CreationOptional<string>;
  declare orderId: string;
  declare kind: HoldKind;
  declare expiresAt: Date;
  declare createdAt: CreationOptional<Date>;
  declare releasedAt: Date | null;
  declare releasedReason: HoldReleased | null;

  declare order?: NonAttribute<Order>;
}

export function initHold(sequelize: Sequelize): void {
  Hold.init(
    {
      id: key(),
      orderId: text(),
      kind: oneOf(holdKinds),
      expiresAt: instant('expiresAt'),
      createdAt: writtenAt('createdAt'),
      releasedAt: nullable(instant('releasedAt')),
      releasedReason: nullable(oneOf(holdReleaseds)),
    },
    { sequelize, tableName: 'holds' },
  );
}
