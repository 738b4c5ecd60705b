import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { key, text, writtenAt } from '../columns.ts';

/** A wrong password or code, to slow the next one down. */
export class SignInFailure extends Model<
  InferAttributes<SignInFailure>,
  InferCreationAttributes<SignInFailure>
> {
  declare id: CreationOptional<string>;
  /** Lower-case e-mail. */
  declare account: string;
  declare address: string;
  declare at: CreationOptional<Date>;
}

export function initSignInFailure(sequelize: Sequelize): void {
  SignInFailure.init(
    {
      id: key(),
      account: text(),
      address: text(),
      at: writtenAt('at'),
    },
    { sequelize, tableName: 'sign_in_failures' },
  );
}
