import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { flag, instant, key, nullable, oneOf, text, writtenAt } from '../columns.ts';

export const consentKinds = ['policies', 'allergy-data', 'show-photos'] as const;
export type ConsentKind = (typeof consentKinds)[number];

/** What somebody agreed to, under which text. */
export class Consent extends Model<InferAttributes<Consent>, InferCreationAttributes<Consent>> {
  declare id: CreationOptional<string>;
  declare orderId: string | null;
  declare userId: string | null;
  declare kind: ConsentKind;
  declare policyVersionId: string | null;
  declare given: boolean;
  declare at: CreationOptional<Date>;
  declare withdrawnAt: Date | null;
}

export function initConsent(sequelize: Sequelize): void {
  Consent.init(
    {
      id: key(),
      orderId: nullable(text()),
      userId: nullable(text()),
      kind: oneOf(consentKinds),
      policyVersionId: nullable(text()),
      given: flag('given'),
      at: writtenAt('at'),
      withdrawnAt: nullable(instant('withdrawnAt')),
    },
    { sequelize, tableName: 'consents' },
  );
}
