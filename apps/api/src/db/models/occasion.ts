import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { instant, integer, nullable, text, withDefault } from '../columns.ts';

/** What a cake is for. */
export class Occasion extends Model<InferAttributes<Occasion>, InferCreationAttributes<Occasion>> {
  declare id: string;
  declare name: string;
  declare noticeDays: CreationOptional<number>;
  declare position: CreationOptional<number>;
  declare archivedAt: Date | null;
}

export function initOccasion(sequelize: Sequelize): void {
  Occasion.init(
    {
      id: { ...text(), primaryKey: true },
      name: text(),
      noticeDays: withDefault(integer(), 0),
      position: withDefault(integer(), 0),
      archivedAt: nullable(instant('archivedAt')),
    },
    { sequelize, tableName: 'occasions' },
  );
}
