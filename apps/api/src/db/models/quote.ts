import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import {
  instant,
  integer,
  key,
  nullable,
  oneOf,
  text,
  withDefault,
  writtenAt,
} from '../columns.ts';
import type { OrderRevision } from './order-revision.ts';
import type { QuoteLine } from './quote-line.ts';

export const quoteStates = ['draft', 'sent', 'agreed', 'lapsed', 'withdrawn'] as const;
export type QuoteState = (typeof quoteStates)[number];

export const quoteAgreedBies = ['customer', 'studio'] as const;
export type QuoteAgreedBy = (typeof quoteAgreedBies)[number];

/** The baker's price for a revision. A settled one never changes. */
export class Quote extends Model<InferAttributes<Quote>, InferCreationAttributes<Quote>> {
  declare id: CreationOptional<string>;
  declare orderId: string;
  declare revisionId: string;
  declare n: number;
  declare state: QuoteState;
  declare termsText: CreationOptional<string>;
  declare note: CreationOptional<string>;
  declare totalMinor: number;
  declare depositMinor: CreationOptional<number>;
  declare currency: string;
  declare expiresAt: Date | null;
  declare depositDueAt: Date | null;
  declare balanceDueOn: string | null;
  declare sentAt: Date | null;
  declare agreedAt: Date | null;
  declare agreedBy: QuoteAgreedBy | null;
  declare createdAt: CreationOptional<Date>;
  declare createdByUserId: string | null;

  declare revision?: NonAttribute<OrderRevision>;
  declare lines?: NonAttribute<QuoteLine[]>;
}

export function initQuote(sequelize: Sequelize): void {
  Quote.init(
    {
      id: key(),
      orderId: text(),
      revisionId: text(),
      n: integer(),
      state: oneOf(quoteStates),
      termsText: withDefault(text(), ''),
      note: withDefault(text(), ''),
      totalMinor: integer(),
      depositMinor: withDefault(integer(), 0),
      currency: text(),
      expiresAt: nullable(instant('expiresAt')),
      depositDueAt: nullable(instant('depositDueAt')),
      balanceDueOn: nullable(text()),
      sentAt: nullable(instant('sentAt')),
      agreedAt: nullable(instant('agreedAt')),
      agreedBy: nullable(oneOf(quoteAgreedBies)),
      createdAt: writtenAt('createdAt'),
      createdByUserId: nullable(text()),
    },
    { sequelize, tableName: 'quotes' },
  );
}
