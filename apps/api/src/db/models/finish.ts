import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { finishIds } from '#shared/contracts/vocabulary.ts';
import type { FinishId } from '#shared/contracts/vocabulary.ts';
import { instant, integer, nullable, oneOf, text, withDefault } from '../columns.ts';

/** How a coat is finished. */
export class Finish extends Model<InferAttributes<Finish>, InferCreationAttributes<Finish>> {
  declare id: FinishId;
  declare name: string;
  declare blurb: CreationOptional<string>;
  declare position: CreationOptional<number>;
  declare archivedAt: Date | null;
}

export function initFinish(sequelize: Sequelize): void {
  Finish.init(
    {
      id: { ...oneOf(finishIds), primaryKey: true },
      name: text(),
      blurb: withDefault(text(), ''),
      position: withDefault(integer(), 0),
      archivedAt: nullable(instant('archivedAt')),
    },
    { sequelize, tableName: 'finishes' },
  );
}
