import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { instant, key, nullable, oneOf, text, writtenAt } from '../columns.ts';

export const closureKinds = ['holiday', 'blocked', 'outage'] as const;
export type ClosureKind = (typeof closureKinds)[number];

/** Days without work or pickups. */
export class Closure extends Model<InferAttributes<Closure>, InferCreationAttributes<Closure>> {
  declare id: CreationOptional<string>;
  declare fromDate: string;
  declare toDate: string;
  declare kind: ClosureKind;
  declare reason: string;
  declare createdAt: CreationOptional<Date>;
  declare createdByUserId: string | null;
  declare reopenedAt: Date | null;
}

export function initClosure(sequelize: Sequelize): void {
  Closure.init(
    {
      id: key(),
      fromDate: text(),
      toDate: text(),
      kind: oneOf(closureKinds),
      reason: text(),
      createdAt: writtenAt('createdAt'),
      createdByUserId: nullable(text()),
      reopenedAt: nullable(instant('reopenedAt')),
    },
    { sequelize, tableName: 'closures' },
  );
}
