import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import type { Advice } from '#shared/contracts/estimates.ts';
import { orderContents } from '#shared/contracts/contents.ts';
import type { OrderContents } from '#shared/contracts/contents.ts';
import {
  flag,
  instant,
  integer,
  json,
  key,
  nullable,
  text,
  withDefault,
  writtenAt,
} from '../columns.ts';
import { adviceList } from '../json-shapes.ts';

/**
 * An order contains something else than its customer was told, because a label or a formula has
 * changed since. The newest that has not ended says what the order contains.
 */
export class ContentChange extends Model<
  InferAttributes<ContentChange>,
  InferCreationAttributes<ContentChange>
> {
  declare id: CreationOptional<string>;
  declare orderId: string;
  declare revisionId: string;
  /** Counts an order's changes. */
  declare n: number;
  /** The same for all orders that one save has changed. */
  declare saveId: string;
  /** What changed: the label of a product, or the version of a formula that took another's place. */
  declare ingredientId: string | null;
  declare formulaVersionId: string | null;
  /** What the customer knew until then. */
  declare told: OrderContents;
  declare holds: OrderContents;
  /** Everything advised about who eats it, as it is now. */
  declare advice: Advice[];
  /** Something guests declared is against it now that was not before. */
  declare clashes: boolean;
  /** When the customer's mail goes out unless the change is taken back first. */
  declare mailAt: Date;
  declare at: CreationOptional<Date>;
  declare byUserId: string;
  /** A baker has seen it, and written what is done about it where it clashes. */
  declare acknowledgedAt: Date | null;
  declare acknowledgedByUserId: string | null;
  declare acknowledgedNote: CreationOptional<string>;
  /** Told otherwise than by the mail: by whom, when and how. */
  declare toldAt: Date | null;
  declare toldByUserId: string | null;
  declare toldHow: CreationOptional<string>;
  /** Taken back, or overtaken by a later change, before the customer was told. */
  declare endedAt: Date | null;
}

export function initContentChange(sequelize: Sequelize): void {
  ContentChange.init(
    {
      id: key(),
      orderId: text(),
      revisionId: text(),
      n: integer(),
      saveId: text(),
      ingredientId: nullable(text()),
      formulaVersionId: nullable(text()),
      told: json('told', orderContents),
      holds: json('holds', orderContents),
      advice: json('advice', adviceList),
      clashes: flag('clashes'),
      mailAt: instant('mailAt'),
      at: writtenAt('at'),
      byUserId: text(),
      acknowledgedAt: nullable(instant('acknowledgedAt')),
      acknowledgedByUserId: nullable(text()),
      acknowledgedNote: withDefault(text(), ''),
      toldAt: nullable(instant('toldAt')),
      toldByUserId: nullable(text()),
      toldHow: withDefault(text(), ''),
      endedAt: nullable(instant('endedAt')),
    },
    { sequelize, tableName: 'content_changes' },
  );
}
