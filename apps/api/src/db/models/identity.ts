import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { instant, key, nullable, oneOf, text, writtenAt } from '../columns.ts';
import type { User } from './user.ts';

export const identityProviders = ['google'] as const;
export type IdentityProvider = (typeof identityProviders)[number];

/** An account at another service, keyed by its subject. */
export class Identity extends Model<InferAttributes<Identity>, InferCreationAttributes<Identity>> {
  declare id: CreationOptional<string>;
  declare userId: string;
  declare provider: IdentityProvider;
  declare subject: string;
  declare createdAt: CreationOptional<Date>;
  declare lastUsedAt: Date | null;

  declare user?: NonAttribute<User>;
}

export function initIdentity(sequelize: Sequelize): void {
  Identity.init(
    {
      id: key(),
      userId: text(),
      provider: oneOf(identityProviders),
      subject: text(),
      createdAt: writtenAt('createdAt'),
      lastUsedAt: nullable(instant('lastUsedAt')),
    },
    { sequelize, tableName: 'identities' },
  );
}
