import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { json, key, nullable, oneOf, text, writtenAt } from '../columns.ts';
import { idFacts } from '../json-shapes.ts';
import type { IdFacts } from '../json-shapes.ts';
import { actorKinds, type ActorKind } from './order-event.ts';

/** Who did what to anything else, ids only; refuses UPDATE and DELETE. */
export class Audit extends Model<InferAttributes<Audit>, InferCreationAttributes<Audit>> {
  declare id: CreationOptional<string>;
  declare at: CreationOptional<Date>;
  declare actorKind: ActorKind;
  declare actorUserId: string | null;
  declare action: string;
  declare subjectKind: string;
  declare subjectId: string;
  declare data: IdFacts;
}

export function initAudit(sequelize: Sequelize): void {
  Audit.init(
    {
      id: key(),
      at: writtenAt('at'),
      actorKind: oneOf(actorKinds),
      actorUserId: nullable(text()),
      action: text(),
      subjectKind: text(),
      subjectId: text(),
      data: json('data', idFacts),
    },
    { sequelize, tableName: 'audit' },
  );
}
