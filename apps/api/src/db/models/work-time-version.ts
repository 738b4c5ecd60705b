import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { instant, integer, json, key, nullable, text, writtenAt } from '../columns.ts';
import { jsonObject } from '../json-shapes.ts';
import type { JsonObject } from '../json-shapes.ts';

/** How long work takes, as it stood; never changed in place. */
export class WorkTimeVersion extends Model<
  InferAttributes<WorkTimeVersion>,
  InferCreationAttributes<WorkTimeVersion>
> {
  declare id: CreationOptional<string>;
  declare n: number;
  declare content: JsonObject;
  declare validFrom: Date;
  declare createdAt: CreationOptional<Date>;
  declare createdByUserId: string | null;
}

export function initWorkTimeVersion(sequelize: Sequelize): void {
  WorkTimeVersion.init(
    {
      id: key(),
      n: integer(),
      content: json('content', jsonObject),
      validFrom: instant('validFrom'),
      createdAt: writtenAt('createdAt'),
      createdByUserId: nullable(text()),
    },
    { sequelize, tableName: 'work_time_versions' },
  );
}
