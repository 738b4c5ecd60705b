import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { flag, integer, key, nullable, oneOf, text, withDefault } from '../columns.ts';

export const equipmentKinds = ['mixer', 'oven-deck'] as const;
export type EquipmentKind = (typeof equipmentKinds)[number];

/** Mixers and oven decks. */
export class Equipment extends Model<
  InferAttributes<Equipment>,
  InferCreationAttributes<Equipment>
> {
  declare id: CreationOptional<string>;
  declare kind: EquipmentKind;
  declare name: string;
  /** Of a mixer's bowl. */
  declare capacityMg: number | null;
  /** Of a deck. */
  declare widthMm: number | null;
  declare depthMm: number | null;
  declare heightMm: number | null;
  declare active: CreationOptional<boolean>;
}

export function initEquipment(sequelize: Sequelize): void {
  Equipment.init(
    {
      id: key(),
      kind: oneOf(equipmentKinds),
      name: text(),
      capacityMg: nullable(integer()),
      widthMm: nullable(integer()),
      depthMm: nullable(integer()),
      heightMm: nullable(integer()),
      active: withDefault(flag('active'), true),
    },
    { sequelize, tableName: 'equipment' },
  );
}
