import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { integer, key, nullable, oneOf, text, writtenAt } from '../columns.ts';

export const ledgerKinds = [
  'charge',
  'payment',
  'refund',
  'credit',
  'tip',
  'stand-deposit',
  'adjustment',
] as const;
export type LedgerKind = (typeof ledgerKinds)[number];

export const paymentMethods = ['card', 'cash', 'transfer', 'other'] as const;
export type PaymentMethod = (typeof paymentMethods)[number];

/** Money owed and paid; refuses UPDATE and DELETE. Charges are positive, payments and credits negative. */
export class LedgerEntry extends Model<
  InferAttributes<LedgerEntry>,
  InferCreationAttributes<LedgerEntry>
> {
  declare id: CreationOptional<string>;
  declare orderId: string;
  declare kind: LedgerKind;
  declare amountMinor: number;
  declare currency: string;
  declare quoteId: string | null;
  declare paymentAttemptId: string | null;
  declare reversesEntryId: string | null;
  declare method: PaymentMethod | null;
  declare reason: string | null;
  declare byUserId: string | null;
  declare at: CreationOptional<Date>;
}

export function initLedgerEntry(sequelize: Sequelize): void {
  LedgerEntry.init(
    {
      id: key(),
      orderId: text(),
      kind: oneOf(ledgerKinds),
      amountMinor: integer(),
      currency: text(),
      quoteId: nullable(text()),
      paymentAttemptId: nullable(text()),
      reversesEntryId: nullable(text()),
      method: nullable(oneOf(paymentMethods)),
      reason: nullable(text()),
      byUserId: nullable(text()),
      at: writtenAt('at'),
    },
    { sequelize, tableName: 'ledger_entries' },
  );
}
