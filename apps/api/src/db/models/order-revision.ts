import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { place } from '#shared/contracts/vocabulary.ts';
import type { Place } from '#shared/contracts/vocabulary.ts';
import { type Estimate, estimate } from '#shared/contracts/estimates.ts';
import {
  flag,
  integer,
  json,
  key,
  nullable,
  oneOf,
  real,
  text,
  withDefault,
  writtenAt,
} from '../columns.ts';
import type { DeclaredAllergy } from './declared-allergy.ts';
import type { DeclaredDiet } from './declared-diet.ts';
import type { Order } from './order.ts';
import type { OrderItem } from './order-item.ts';
import type { RevisionFormulaVersion } from './revision-formula-version.ts';
import type { RevisionPolicyVersion } from './revision-policy-version.ts';

export const fulfilments = ['collect', 'deliver', 'deliver-and-set-up'] as const;
export type Fulfilment = (typeof fulfilments)[number];

export const revisionAuthors = ['guest', 'customer', 'counter', 'baker', 'owner'] as const;
export type RevisionAuthor = (typeof revisionAuthors)[number];

/** The whole of what was asked for, each time it changed, with the versions it was worked out with. */
export class OrderRevision extends Model<
  InferAttributes<OrderRevision>,
  InferCreationAttributes<OrderRevision>
> {
  declare id: CreationOptional<string>;
  declare orderId: string;
  declare n: number;
  declare headCount: number;
  declare occasionId: string;
  declare otherDesserts: CreationOptional<boolean>;
  declare portionSizeId: string;
  declare infants: CreationOptional<boolean>;
  declare susceptibleGuests: CreationOptional<boolean>;
  declare dietNote: CreationOptional<string>;
  declare pickupDate: string | null;
  declare windowStartMinute: number | null;
  declare windowMinutes: number | null;
  declare settingPlace: Place;
  /** Null is "don't know". */
  declare settingWarmestC: number | null;
  declare settingMinutesOut: number;
  declare settingDriveMinutes: number;
  /** When it is cut, minutes since midnight where it stands; null while nobody knows. */
  declare settingServedMinute: number | null;
  declare fulfilment: CreationOptional<Fulfilment>;
  declare addressStreet: string | null;
  declare addressTown: string | null;
  declare addressPostcode: string | null;
  declare addressAccess: string | null;
  declare dayContactName: string | null;
  declare dayContactPhone: string | null;
  declare arrivalStartMinute: number | null;
  declare arrivalMinutes: number | null;
  declare travelMinutes: number | null;
  declare note: CreationOptional<string>;
  /** What differs, for whoever has to agree to it. */
  declare changeNote: string | null;
  /** As it stood: the offer. */
  declare estimate: Estimate;
  declare priceBookVersionId: string;
  declare workTimeVersionId: string;
  declare totalMinor: number;
  declare currency: string;
  declare createdByRole: RevisionAuthor;
  declare createdByUserId: string | null;
  declare createdAt: CreationOptional<Date>;

  declare order?: NonAttribute<Order>;
  declare items?: NonAttribute<OrderItem[]>;
  declare allergies?: NonAttribute<DeclaredAllergy[]>;
  declare diets?: NonAttribute<DeclaredDiet[]>;
  declare formulaVersions?: NonAttribute<RevisionFormulaVersion[]>;
  declare policyVersions?: NonAttribute<RevisionPolicyVersion[]>;
}

export function initOrderRevision(sequelize: Sequelize): void {
  OrderRevision.init(
    {
      id: key(),
      orderId: text(),
      n: integer(),
      headCount: integer(),
      occasionId: text(),
      otherDesserts: withDefault(flag('otherDesserts'), false),
      portionSizeId: text(),
      infants: withDefault(flag('infants'), false),
      susceptibleGuests: withDefault(flag('susceptibleGuests'), false),
      dietNote: withDefault(text(), ''),
      pickupDate: nullable(text()),
      windowStartMinute: nullable(integer()),
      windowMinutes: nullable(integer()),
      settingPlace: oneOf(place.options),
      settingWarmestC: nullable(real()),
      settingMinutesOut: integer(),
      settingDriveMinutes: integer(),
      settingServedMinute: nullable(integer()),
      fulfilment: withDefault(oneOf(fulfilments), 'collect'),
      addressStreet: nullable(text()),
      addressTown: nullable(text()),
      addressPostcode: nullable(text()),
      addressAccess: nullable(text()),
      dayContactName: nullable(text()),
      dayContactPhone: nullable(text()),
      arrivalStartMinute: nullable(integer()),
      arrivalMinutes: nullable(integer()),
      travelMinutes: nullable(integer()),
      note: withDefault(text(), ''),
      changeNote: nullable(text()),
      estimate: json('estimate', estimate),
      priceBookVersionId: text(),
      workTimeVersionId: text(),
      totalMinor: integer(),
      currency: text(),
      createdByRole: oneOf(revisionAuthors),
      createdByUserId: nullable(text()),
      createdAt: writtenAt('createdAt'),
    },
    { sequelize, tableName: 'order_revisions' },
  );
}
