import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { flag, key, nullable, text, withDefault } from '../columns.ts';
import type { PersonSkill } from './person-skill.ts';
import type { User } from './user.ts';

/** Somebody who works at the bench; may or may not sign in. */
export class Person extends Model<InferAttributes<Person>, InferCreationAttributes<Person>> {
  declare id: CreationOptional<string>;
  declare name: string;
  declare userId: string | null;
  declare active: CreationOptional<boolean>;

  declare user?: NonAttribute<User | null>;
  declare skills?: NonAttribute<PersonSkill[]>;
}

export function initPerson(sequelize: Sequelize): void {
  Person.init(
    {
      id: key(),
      name: text(),
      userId: nullable(text()),
      active: withDefault(flag('active'), true),
    },
    { sequelize, tableName: 'people' },
  );
}
