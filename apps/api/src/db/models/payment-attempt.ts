import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { integer, key, nullable, oneOf, text, writtenAt } from '../columns.ts';

export const paymentProviders = ['stripe', 'counter'] as const;
export type PaymentProvider = (typeof paymentProviders)[number];

export const paymentPurposes = ['deposit', 'balance', 'other'] as const;
export type PaymentPurpose = (typeof paymentPurposes)[number];

export const paymentStates = ['created', 'pending', 'succeeded', 'failed', 'cancelled'] as const;
export type PaymentState = (typeof paymentStates)[number];

/** One try at a payment. */
export class PaymentAttempt extends Model<
  InferAttributes<PaymentAttempt>,
  InferCreationAttributes<PaymentAttempt>
> {
  declare id: CreationOptional<string>;
  declare orderId: string;
  declare provider: PaymentProvider;
  declare providerRef: string | null;
  declare purpose: PaymentPurpose;
  declare amountMinor: number;
  declare currency: string;
  declare state: PaymentState;
  declare failureCode: string | null;
  declare uniqueKey: string;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function initPaymentAttempt(sequelize: Sequelize): void {
  PaymentAttempt.init(
    {
      id: key(),
      orderId: text(),
      provider: oneOf(paymentProviders),
      providerRef: nullable(text()),
      purpose: oneOf(paymentPurposes),
      amountMinor: integer(),
      currency: text(),
      state: oneOf(paymentStates),
      failureCode: nullable(text()),
      uniqueKey: text(),
      createdAt: writtenAt('createdAt'),
      updatedAt: writtenAt('updatedAt'),
    },
    { sequelize, tableName: 'payment_attempts' },
  );
}
