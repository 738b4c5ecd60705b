import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { integer, key, oneOf, text, writtenAt } from '../columns.ts';

export const mailOutcomes = ['sent', 'deferred', 'refused', 'unreachable'] as const;
export type MailOutcome = (typeof mailOutcomes)[number];

/** One try at handing an e-mail to the server. */
export class MailAttempt extends Model<
  InferAttributes<MailAttempt>,
  InferCreationAttributes<MailAttempt>
> {
  declare id: CreationOptional<string>;
  declare sentMailId: number;
  declare at: CreationOptional<Date>;
  declare outcome: MailOutcome;
  declare response: string;
}

export function initMailAttempt(sequelize: Sequelize): void {
  MailAttempt.init(
    {
      id: key(),
      sentMailId: integer(),
      at: writtenAt('at'),
      outcome: oneOf(mailOutcomes),
      response: text(),
    },
    { sequelize, tableName: 'mail_attempts' },
  );
}
