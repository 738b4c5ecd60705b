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
import { instant, json, key, nullable, oneOf, text, writtenAt } from '../columns.ts';
import { idFacts } from '../json-shapes.ts';
import type { IdFacts } from '../json-shapes.ts';
import type { User } from './user.ts';

export const tokenPurposes = [
  'sign-in',
  'invitation',
  'password-reset',
  'first-owner',
  'confirm-action',
] as const;
export type TokenPurpose = (typeof tokenPurposes)[number];

/** A one-time link, stored hashed. */
export class Token extends Model<InferAttributes<Token>, InferCreationAttributes<Token>> {
  declare id: CreationOptional<string>;
  declare hash: string;
  declare purpose: TokenPurpose;
  declare userId: string | null;
  declare email: string | null;
  declare role: Role | null;
  declare data: IdFacts;
  declare expiresAt: Date;
  declare usedAt: Date | null;
  declare createdAt: CreationOptional<Date>;
  declare createdByUserId: string | null;

  declare user?: NonAttribute<User | null>;
}

export function initToken(sequelize: Sequelize): void {
  Token.init(
    {
      id: key(),
      hash: text(),
      purpose: oneOf(tokenPurposes),
      userId: nullable(text()),
      email: nullable(text()),
      role: nullable(oneOf(roles)),
      data: json('data', idFacts),
      expiresAt: instant('expiresAt'),
      usedAt: nullable(instant('usedAt')),
      createdAt: writtenAt('createdAt'),
      createdByUserId: nullable(text()),
    },
    { sequelize, tableName: 'tokens' },
  );
}
