import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { labelRegion } from '#shared/contracts/vocabulary.ts';
import type { LabelRegion } from '#shared/contracts/vocabulary.ts';
import { flag, integer, json, oneOf, text, withDefault } from '../columns.ts';
import { jsonObject, monthlyFigures } from '../json-shapes.ts';
import type { JsonObject } from '../json-shapes.ts';

export const temperatureLeads = ['F', 'C'] as const;
export type TemperatureLead = (typeof temperatureLeads)[number];

export const lengthLeads = ['in', 'cm'] as const;
export type LengthLead = (typeof lengthLeads)[number];

/** The one studio this installation belongs to; always the row with id 1. */
export class Studio extends Model<InferAttributes<Studio>, InferCreationAttributes<Studio>> {
  declare id: CreationOptional<number>;
  declare name: string;
  declare street: string;
  declare town: string;
  declare region: string;
  declare postcode: string;
  /** ISO 3166-1 alpha-2. */
  declare country: string;
  declare phone: string;
  declare email: string;
  /** IANA name; pickups remember the one they were promised in. */
  declare zone: string;
  /** ISO 4217; fixed after the first order. */
  declare currency: string;
  declare locale: string;
  declare labelRegion: LabelRegion;
  declare temperatureLead: TemperatureLead;
  declare lengthLead: LengthLead;
  declare altitudeM: CreationOptional<number>;
  declare firstOrderNumber: CreationOptional<number>;
  declare answerHours: CreationOptional<number>;
  declare guestHoldMinutes: CreationOptional<number>;
  declare holdsPerEmail: CreationOptional<number>;
  declare holdsPerAddress: CreationOptional<number>;
  declare bookOpenMonths: CreationOptional<number>;
  /** Places a day kept back for regulars. */
  declare regularsKeptBack: CreationOptional<number>;
  declare utilisationPpm: CreationOptional<number>;
  /** Head count times this when other desserts are served. */
  declare dessertFactorPpm: CreationOptional<number>;
  /** Degrees C, January first. */
  declare monthlyWarmestC: number[];
  declare defaultPortionSizeId: string;
  /** Characters that fit on a tier per 100 mm of its width, in two lines. */
  declare wordsPerDecimetre: CreationOptional<number>;
  declare offersDelivery: CreationOptional<boolean>;
  declare offersSetUp: CreationOptional<boolean>;
  declare requireSecondFactor: CreationOptional<boolean>;
  declare maxPhotos: CreationOptional<number>;
  declare maxPhotoBytes: CreationOptional<number>;
  declare maxPhotoPixels: CreationOptional<number>;
  /** Overrides of the kitchen constants, by name. */
  declare kitchen: JsonObject;
  declare kitchenNotice: string;
  declare homeKitchenText: string;
  declare eggAdvisory: string;
}

export function initStudio(sequelize: Sequelize): void {
  Studio.init(
    {
      id: { ...withDefault(integer(), 1), primaryKey: true },
      name: text(),
      street: text(),
      town: text(),
      region: text(),
      postcode: text(),
      country: text(),
      phone: text(),
      email: text(),
      zone: text(),
      currency: text(),
      locale: text(),
      labelRegion: oneOf(labelRegion.options),
      temperatureLead: oneOf(temperatureLeads),
      lengthLead: oneOf(lengthLeads),
      altitudeM: withDefault(integer(), 0),
      firstOrderNumber: withDefault(integer(), 2401),
      answerHours: withDefault(integer(), 48),
      guestHoldMinutes: withDefault(integer(), 30),
      holdsPerEmail: withDefault(integer(), 3),
      holdsPerAddress: withDefault(integer(), 5),
      bookOpenMonths: withDefault(integer(), 18),
      regularsKeptBack: withDefault(integer(), 0),
      utilisationPpm: withDefault(integer(), 700000),
      dessertFactorPpm: withDefault(integer(), 700000),
      monthlyWarmestC: json('monthlyWarmestC', monthlyFigures),
      defaultPortionSizeId: text(),
      wordsPerDecimetre: withDefault(integer(), 13),
      offersDelivery: withDefault(flag('offersDelivery'), false),
      offersSetUp: withDefault(flag('offersSetUp'), false),
      requireSecondFactor: withDefault(flag('requireSecondFactor'), true),
      maxPhotos: withDefault(integer(), 8),
      maxPhotoBytes: withDefault(integer(), 26214400),
      maxPhotoPixels: withDefault(integer(), 50000000),
      kitchen: json('kitchen', jsonObject),
      kitchenNotice: text(),
      homeKitchenText: text(),
      eggAdvisory: text(),
    },
    { sequelize, tableName: 'studio' },
  );
}
