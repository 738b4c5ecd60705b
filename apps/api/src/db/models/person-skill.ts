import { Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, NonAttribute, Sequelize } from 'sequelize';
import { text } from '../columns.ts';
import type { Skill } from './skill.ts';

/** Who can do what. */
export class PersonSkill extends Model<
  InferAttributes<PersonSkill>,
  InferCreationAttributes<PersonSkill>
> {
  declare personId: string;
  declare skillId: string;

  declare skill?: NonAttribute<Skill>;
}

export function initPersonSkill(sequelize: Sequelize): void {
  PersonSkill.init(
    {
      personId: { ...text(), primaryKey: true },
      skillId: { ...text(), primaryKey: true },
    },
    { sequelize, tableName: 'person_skills' },
  );
}
