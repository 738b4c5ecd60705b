import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { integer, key, nullable, oneOf, text, withDefault } from '../columns.ts';

export const quoteLineKinds = [
  'tier',
  'sheet',
  'cutting-cake',
  'sponge',
  'filling',
  'frosting',
  'decoration',
  'words',
  'finish',
  'extra',
  'pieces',
  'stand',
  'rush',
  'delivery',
  'minimum',
  'discount',
  'tax',
  'rounding',
  'other',
] as const;
export type QuoteLineKind = (typeof quoteLineKinds)[number];

/** One line of a quote, in the order of the price. */
export class QuoteLine extends Model<
  InferAttributes<QuoteLine>,
  InferCreationAttributes<QuoteLine>
> {
  declare id: CreationOptional<string>;
  declare quoteId: string;
  declare position: number;
  declare kind: QuoteLineKind;
  declare label: string;
  declare quantity: CreationOptional<number>;
  declare amountMinor: number;
  declare taxCategory: string | null;
  /** Of a discount. */
  declare reason: string | null;
}

export function initQuoteLine(sequelize: Sequelize): void {
  QuoteLine.init(
    {
      id: key(),
      quoteId: text(),
      position: integer(),
      kind: oneOf(quoteLineKinds),
      label: text(),
      quantity: withDefault(integer(), 1),
      amountMinor: integer(),
      taxCategory: nullable(text()),
      reason: nullable(text()),
    },
    { sequelize, tableName: 'quote_lines' },
  );
}
