import { Model } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize';
import { text } from '../columns.ts';

/** Something not everybody can do. */
export class Skill extends Model<InferAttributes<Skill>, InferCreationAttributes<Skill>> {
  declare id: string;
  declare name: string;
}

export function initSkill(sequelize: Sequelize): void {
  Skill.init(
    {
      id: { ...text(), primaryKey: true },
      name: text(),
    },
    { sequelize, tableName: 'skills' },
  );
}
