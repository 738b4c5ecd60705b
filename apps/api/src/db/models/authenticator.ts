import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
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

export const authenticatorKinds = ['totp', 'passkey'] as const;
export type AuthenticatorKind = (typeof authenticatorKinds)[number];

/** A second factor. */
export class Authenticator extends Model<
  InferAttributes<Authenticator>,
  InferCreationAttributes<Authenticator>
> {
  declare id: CreationOptional<string>;
  declare userId: string;
  declare kind: AuthenticatorKind;
  declare label: CreationOptional<string>;
  /** Totp. */
  declare secretEncrypted: string | null;
  /** Passkey. */
  declare credentialId: string | null;
  declare publicKey: string | null;
  declare signCount: CreationOptional<number>;
  /** Of totp, so that a code works once. */
  declare lastStep: number | null;
  declare createdAt: CreationOptional<Date>;
  declare confirmedAt: Date | null;
  declare lastUsedAt: Date | null;
}

export function initAuthenticator(sequelize: Sequelize): void {
  Authenticator.init(
    {
      id: key(),
      userId: text(),
      kind: oneOf(authenticatorKinds),
      label: withDefault(text(), ''),
      secretEncrypted: nullable(text()),
      credentialId: nullable(text()),
      publicKey: nullable(text()),
      signCount: withDefault(integer(), 0),
      lastStep: nullable(integer()),
      createdAt: writtenAt('createdAt'),
      confirmedAt: nullable(instant('confirmedAt')),
      lastUsedAt: nullable(instant('lastUsedAt')),
    },
    { sequelize, tableName: 'authenticators' },
  );
}
