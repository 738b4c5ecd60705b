import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { priceBookContent } from '#shared/contracts/prices.ts';
import type { PriceBookContent } from '#shared/contracts/prices.ts';
import { instant, integer, json, key, nullable, text, writtenAt } from '../columns.ts';

/** Every price of the studio as it stood; never changed in place. */
export class PriceBookVersion extends Model<
  InferAttributes<PriceBookVersion>,
  InferCreationAttributes<PriceBookVersion>
> {
  declare id: CreationOptional<string>;
  declare n: number;
  declare content: PriceBookContent;
  declare validFrom: Date;
  declare createdAt: CreationOptional<Date>;
  declare createdByUserId: string | null;
}

export function initPriceBookVersion(sequelize: Sequelize): void {
  PriceBookVersion.init(
    {
      id: key(),
      n: integer(),
      content: json('content', priceBookContent),
      validFrom: instant('validFrom'),
      createdAt: writtenAt('createdAt'),
      createdByUserId: nullable(text()),
    },
    { sequelize, tableName: 'price_book_versions' },
  );
}
