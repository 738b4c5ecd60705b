import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { json, key, oneOf, text, writtenAt } from '../columns.ts';
import { jsonObject } from '../json-shapes.ts';
import type { JsonObject } from '../json-shapes.ts';

export const savedPages = ['orders', 'calendar'] as const;
export type SavedPage = (typeof savedPages)[number];

/** A way of looking at a staff table that somebody kept. */
export class SavedView extends Model<
  InferAttributes<SavedView>,
  InferCreationAttributes<SavedView>
> {
  declare id: CreationOptional<string>;
  declare userId: string;
  declare page: SavedPage;
  declare name: string;
  declare query: JsonObject;
  declare createdAt: CreationOptional<Date>;
}

export function initSavedView(sequelize: Sequelize): void {
  SavedView.init(
    {
      id: key(),
      userId: text(),
      page: oneOf(savedPages),
      name: text(),
      query: json('query', jsonObject),
      createdAt: writtenAt('createdAt'),
    },
    { sequelize, tableName: 'saved_views' },
  );
}
