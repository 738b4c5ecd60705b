import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import {
  countedKey,
  instant,
  integer,
  json,
  nullable,
  oneOf,
  text,
  withDefault,
  writtenAt,
} from '../columns.ts';
import { idFacts } from '../json-shapes.ts';
import type { IdFacts } from '../json-shapes.ts';

export const outboxStates = ['queued', 'leased', 'done', 'given-up'] as const;
export type OutboxState = (typeof outboxStates)[number];

/** A side effect to be carried out, written in the transaction that caused it. */
export class OutboxRow extends Model<
  InferAttributes<OutboxRow>,
  InferCreationAttributes<OutboxRow>
> {
  declare id: CreationOptional<number>;
  /** Closed union in outbox/events.ts. */
  declare kind: string;
  declare payload: IdFacts;
  declare uniqueKey: string;
  /** Rows of one order are carried out in turn. */
  declare orderId: string | null;
  declare state: CreationOptional<OutboxState>;
  declare attempts: CreationOptional<number>;
  declare nextAt: Date;
  declare leasedUntil: Date | null;
  declare leasedBy: string | null;
  declare lastError: string | null;
  declare createdAt: CreationOptional<Date>;
  declare doneAt: Date | null;
}

export function initOutboxRow(sequelize: Sequelize): void {
  OutboxRow.init(
    {
      id: countedKey(),
      kind: text(),
      payload: json('payload', idFacts),
      uniqueKey: text(),
      orderId: nullable(text()),
      state: withDefault(oneOf(outboxStates), 'queued'),
      attempts: withDefault(integer(), 0),
      nextAt: instant('nextAt'),
      leasedUntil: nullable(instant('leasedUntil')),
      leasedBy: nullable(text()),
      lastError: nullable(text()),
      createdAt: writtenAt('createdAt'),
      doneAt: nullable(instant('doneAt')),
    },
    { sequelize, tableName: 'outbox' },
  );
}
