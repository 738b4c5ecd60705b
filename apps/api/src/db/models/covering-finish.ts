import { Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize';
import { coveringIds, finishIds } from '#shared/contracts/vocabulary.ts';
import type { CoveringId, FinishId } from '#shared/contracts/vocabulary.ts';
import { oneOf } from '../columns.ts';

/** Which finishes a covering takes. */
export class CoveringFinish extends Model<
  InferAttributes<CoveringFinish>,
  InferCreationAttributes<CoveringFinish>
> {
  declare coveringId: CoveringId;
  declare finishId: FinishId;
}

export function initCoveringFinish(sequelize: Sequelize): void {
  CoveringFinish.init(
    {
      coveringId: { ...oneOf(coveringIds), primaryKey: true },
      finishId: { ...oneOf(finishIds), primaryKey: true },
    },
    { sequelize, tableName: 'covering_finishes' },
  );
}
