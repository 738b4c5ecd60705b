import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { roles } from '#shared/contracts/vocabulary.ts';
import type { Role } from '#shared/contracts/vocabulary.ts';
import { instant, key, nullable, oneOf, text, writtenAt } from '../columns.ts';
import type { Authenticator } from './authenticator.ts';
import type { Identity } from './identity.ts';
import type { Person } from './person.ts';
import type { RecoveryCode } from './recovery-code.ts';
import type { Session } from './session.ts';

/** Somebody who can sign in; an account exists only once its address is proven. */
export class User extends Model<InferAttributes<User>, InferCreationAttributes<User>> {
  declare id: CreationOptional<string>;
  /** Lower case; null once erased. */
  declare email: string | null;
  declare name: string;
  declare phone: string | null;
  declare role: Role;
  declare passwordHash: string | null;
  declare emailProvenAt: Date | null;
  declare createdAt: CreationOptional<Date>;
  declare lastSignedInAt: Date | null;
  declare endedAt: Date | null;
  declare erasedAt: Date | null;

  declare identities?: NonAttribute<Identity[]>;
  declare authenticators?: NonAttribute<Authenticator[]>;
  declare recoveryCodes?: NonAttribute<RecoveryCode[]>;
  declare sessions?: NonAttribute<Session[]>;
  declare person?: NonAttribute<Person | null>;
}

export function initUser(sequelize: Sequelize): void {
  User.init(
    {
      id: key(),
      email: nullable(text()),
      name: text(),
      phone: nullable(text()),
      role: oneOf(roles),
      passwordHash: nullable(text()),
      emailProvenAt: nullable(instant('emailProvenAt')),
      createdAt: writtenAt('createdAt'),
      lastSignedInAt: nullable(instant('lastSignedInAt')),
      endedAt: nullable(instant('endedAt')),
      erasedAt: nullable(instant('erasedAt')),
    },
    { sequelize, tableName: 'users' },
  );
}
