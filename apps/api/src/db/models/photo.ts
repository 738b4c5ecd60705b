import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { photoKind } from '#shared/contracts/vocabulary.ts';
import type { PhotoKind } from '#shared/contracts/vocabulary.ts';
import {
  instant,
  integer,
  json,
  key,
  nullable,
  oneOf,
  text,
  withDefault,
  writtenAt,
} from '../columns.ts';
import { photoFiles, textList } from '../json-shapes.ts';
import type { PhotoFile } from '../json-shapes.ts';

/** A picture as kept: re-encoded in a few widths, its uploaded bytes gone. */
export class Photo extends Model<InferAttributes<Photo>, InferCreationAttributes<Photo>> {
  declare id: CreationOptional<string>;
  declare orderId: string | null;
  declare kind: PhotoKind;
  /** Whoever holds the key may attach it to an order. */
  declare claimKeyHash: string | null;
  declare uploadedByUserId: string | null;
  declare note: CreationOptional<string>;
  declare position: CreationOptional<number>;
  declare width: number;
  declare height: number;
  declare palette: string[];
  /** Widths and formats there are, smallest first. */
  declare files: PhotoFile[];
  declare originalType: string;
  /** Of all files together. */
  declare bytes: number;
  declare createdAt: CreationOptional<Date>;
  declare attachedAt: Date | null;
  declare removedAt: Date | null;
}

export function initPhoto(sequelize: Sequelize): void {
  Photo.init(
    {
      id: key(),
      orderId: nullable(text()),
      kind: oneOf(photoKind.options),
      claimKeyHash: nullable(text()),
      uploadedByUserId: nullable(text()),
      note: withDefault(text(), ''),
      position: withDefault(integer(), 0),
      width: integer(),
      height: integer(),
      palette: json('palette', textList),
      files: json('files', photoFiles),
      originalType: text(),
      bytes: integer(),
      createdAt: writtenAt('createdAt'),
      attachedAt: nullable(instant('attachedAt')),
      removedAt: nullable(instant('removedAt')),
    },
    { sequelize, tableName: 'photos' },
  );
}
