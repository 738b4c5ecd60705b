import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { instant, text, withDefault } from '../columns.ts';

/** The studio's own words in an e-mail, by template; the facts come from the order. */
export class EmailText extends Model<
  InferAttributes<EmailText>,
  InferCreationAttributes<EmailText>
> {
  declare template: string;
  declare subject: string;
  declare lead: string;
  declare closing: CreationOptional<string>;
  declare updatedAt: Date;
}

export function initEmailText(sequelize: Sequelize): void {
  EmailText.init(
    {
      template: { ...text(), primaryKey: true },
      subject: text(),
      lead: text(),
      closing: withDefault(text(), ''),
      updatedAt: instant('updatedAt'),
    },
    { sequelize, tableName: 'email_texts' },
  );
}
