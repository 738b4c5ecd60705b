import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { instant, key, nullable, oneOf, text, withDefault } from '../columns.ts';

export const contactRoles = ['ordered', 'pays', 'collects'] as const;
export type ContactRole = (typeof contactRoles)[number];

export const reachBies = ['email', 'phone', 'text'] as const;
export type ReachBy = (typeof reachBies)[number];

/** Who ordered, who pays, who collects. Blanked when erased. */
export class OrderContact extends Model<
  InferAttributes<OrderContact>,
  InferCreationAttributes<OrderContact>
> {
  declare id: CreationOptional<string>;
  declare orderId: string;
  declare role: ContactRole;
  declare name: string;
  /** Lower case. */
  declare email: string | null;
  declare phone: string | null;
  declare reachBy: CreationOptional<ReachBy>;
  declare erasedAt: Date | null;
}

export function initOrderContact(sequelize: Sequelize): void {
  OrderContact.init(
    {
      id: key(),
      orderId: text(),
      role: oneOf(contactRoles),
      name: text(),
      email: nullable(text()),
      phone: nullable(text()),
      reachBy: withDefault(oneOf(reachBies), 'email'),
      erasedAt: nullable(instant('erasedAt')),
    },
    { sequelize, tableName: 'order_contacts' },
  );
}
