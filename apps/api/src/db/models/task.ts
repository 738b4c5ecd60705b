import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { taskKinds } from '#shared/contracts/vocabulary.ts';
import {
  instant,
  integer,
  key,
  nullable,
  oneOf,
  text,
  withDefault,
  writtenAt,
} from '../columns.ts';
import type { Assignment } from './assignment.ts';
import type { Order } from './order.ts';

/** What the bench does, and the two that belong to delivering. */
const planTaskKinds = [...taskKinds, 'drive', 'set-up'] as const;
type PlanTaskKind = (typeof planTaskKinds)[number];

export const workStates = ['planned', 'started', 'finished', 'late', 'dropped'] as const;
export type WorkState = (typeof workStates)[number];

/** One piece of work on one order. */
export class Task extends Model<InferAttributes<Task>, InferCreationAttributes<Task>> {
  declare id: CreationOptional<string>;
  declare orderId: string;
  declare revisionId: string;
  declare kind: PlanTaskKind;
  declare label: string;
  declare itemId: string | null;
  declare tierPosition: number | null;
  declare benchMinutes: CreationOptional<number>;
  declare mixerMinutes: CreationOptional<number>;
  declare ovenMinutes: CreationOptional<number>;
  declare skillId: string | null;
  /** It starts at most so long before the pickup window's end: what it makes keeps no longer. */
  declare withinMinutes: number | null;
  declare state: CreationOptional<WorkState>;
  declare minutesTaken: number | null;
  declare startedAt: Date | null;
  declare finishedAt: Date | null;
  declare finishedByUserId: string | null;
  declare createdAt: CreationOptional<Date>;

  declare order?: NonAttribute<Order>;
  declare assignment?: NonAttribute<Assignment | null>;
}

export function initTask(sequelize: Sequelize): void {
  Task.init(
    {
      id: key(),
      orderId: text(),
      revisionId: text(),
      kind: oneOf(planTaskKinds),
      label: text(),
      itemId: nullable(text()),
      tierPosition: nullable(integer()),
      benchMinutes: withDefault(integer(), 0),
      mixerMinutes: withDefault(integer(), 0),
      ovenMinutes: withDefault(integer(), 0),
      skillId: nullable(text()),
      withinMinutes: nullable(integer()),
      state: withDefault(oneOf(workStates), 'planned'),
      minutesTaken: nullable(integer()),
      startedAt: nullable(instant('startedAt')),
      finishedAt: nullable(instant('finishedAt')),
      finishedByUserId: nullable(text()),
      createdAt: writtenAt('createdAt'),
    },
    { sequelize, tableName: 'tasks' },
  );
}
