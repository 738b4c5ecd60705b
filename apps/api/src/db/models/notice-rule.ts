import { Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize';
import { integer, oneOf } from '../columns.ts';
import { itemKinds, type ItemKind } from './order-item.ts';

/** Least notice per kind of item, in whole days. */
export class NoticeRule extends Model<
  InferAttributes<NoticeRule>,
  InferCreationAttributes<NoticeRule>
> {
  declare itemKind: ItemKind;
  declare days: number;
}

export function initNoticeRule(sequelize: Sequelize): void {
  NoticeRule.init(
    {
      itemKind: { ...oneOf(itemKinds), primaryKey: true },
      days: integer(),
    },
    { sequelize, tableName: 'notice_rules' },
  );
}
