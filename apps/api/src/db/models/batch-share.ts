import { Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, NonAttribute, Sequelize } from 'sequelize';
import { integer, text } from '../columns.ts';
import type { Batch } from './batch.ts';
import type { Order } from './order.ts';

/** How much of a batch an order takes. */
export class BatchShare extends Model<
  InferAttributes<BatchShare>,
  InferCreationAttributes<BatchShare>
> {
  declare batchId: string;
  declare orderId: string;
  declare weightMg: number;

  declare batch?: NonAttribute<Batch>;
  declare order?: NonAttribute<Order>;
}

export function initBatchShare(sequelize: Sequelize): void {
  BatchShare.init(
    {
      batchId: { ...text(), primaryKey: true },
      orderId: { ...text(), primaryKey: true },
      weightMg: integer(),
    },
    { sequelize, tableName: 'batch_shares' },
  );
}
