import { DataTypes } from 'sequelize';
import type { ModelAttributeColumnOptions } from 'sequelize';
import type * as z from 'zod/mini';
import { newId } from '#api/platform/ids.ts';
import { currentClock } from './current-database.ts';

/**
 * The few kinds of column there are. The tables are STRICT, so SQLite keeps instants and JSON as
 * TEXT and flags as INTEGER; the getters here turn them back. Queries with `raw: true` see the
 * kept form.
 */
type Column = ModelAttributeColumnOptions;

/** Primary key, a UUID made when the row is. */
export function key(): Column {
  return { type: DataTypes.TEXT, primaryKey: true, defaultValue: newId };
}

/** Primary key that counts up, where rows have an order. */
export function countedKey(): Column {
  return { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true };
}

/** Text; also ids of other rows, colours and local dates. */
export function text(): Column {
  return { type: DataTypes.TEXT, allowNull: false };
}

export function integer(): Column {
  return { type: DataTypes.INTEGER, allowNull: false };
}

/** Temperatures only: everything else is counted in whole units. */
export function real(): Column {
  return { type: DataTypes.DOUBLE, allowNull: false };
}

/** Text out of a closed list; the table has a CHECK with the same words. */
export function oneOf(words: readonly string[]): Column {
  return { type: DataTypes.TEXT, allowNull: false, validate: { isIn: [[...words]] } };
}

/** Yes or no, kept as 1 or 0. */
export function flag(name: string): Column {
  return {
    type: DataTypes.BOOLEAN,
    allowNull: false,
    get() {
      const kept: unknown = this.getDataValue(name);
      return typeof kept === 'number' ? kept === 1 : kept;
    },
  };
}

/** An instant in UTC, kept as sortable text. */
export function instant(name: string): Column {
  return {
    type: DataTypes.DATE,
    allowNull: false,
    get() {
      const kept: unknown = this.getDataValue(name);
      return typeof kept === 'string' ? new Date(kept) : kept;
    },
  };
}

/** The instant the row was written, by the database's clock. */
export function writtenAt(name: string): Column {
  return { ...instant(name), defaultValue: () => currentClock().now() };
}

/** An object or a list, checked by its schema whenever it is read or written. */
export function json(name: string, schema: z.ZodMiniType): Column {
  return {
    type: DataTypes.JSON,
    allowNull: false,
    get() {
      const kept: unknown = this.getDataValue(name);
      if (kept === undefined || kept === null) return kept;
      return schema.parse(typeof kept === 'string' ? JSON.parse(kept) : kept);
    },
    set(value: unknown) {
      this.setDataValue(name, value === null ? null : schema.parse(value));
    },
  };
}

/** May be null, and is unless it is given. */
export function nullable(column: Column): Column {
  return { ...column, allowNull: true, defaultValue: null };
}

export function withDefault(column: Column, value: string | number | boolean): Column {
  return { ...column, defaultValue: value };
}
