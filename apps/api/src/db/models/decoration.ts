import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { decorationEdge, detail } from '#shared/contracts/vocabulary.ts';
import type { DecorationSource, Detail } from '#shared/contracts/vocabulary.ts';
import { flag, instant, integer, json, nullable, oneOf, text, withDefault } from '../columns.ts';
import { sourceList } from '../json-shapes.ts';
import type { DecorationIngredient } from './decoration-ingredient.ts';

export const glyphs = [
  'flower',
  'leaf',
  'pearl',
  'border',
  'figure',
  'topper',
  'fruit',
  'drip',
  'print',
  'ribbon',
  'sprinkle',
] as const;
export type Glyph = (typeof glyphs)[number];

export const decorationPers = ['piece', 'tier', 'cake'] as const;
export type DecorationPer = (typeof decorationPers)[number];

/** Something that goes on a cake, from the studio's list. Prices are in the price book. */
export class Decoration extends Model<
  InferAttributes<Decoration>,
  InferCreationAttributes<Decoration>
> {
  declare id: string;
  declare name: string;
  declare blurb: CreationOptional<string>;
  declare glyph: Glyph;
  declare edge: (typeof decorationEdge.options)[number];
  declare sources: DecorationSource[];
  /** How much fine work it asks of the coat. */
  declare detail: Detail;
  /** Priced each, or once for a tier or the whole cake. */
  declare per: DecorationPer;
  declare minutes: number;
  declare materialsCostMinor: CreationOptional<number>;
  declare weightMg: number;
  /** Before the work on it starts, when somebody else brings it. */
  declare arriveByHours: number | null;
  declare noticeDays: CreationOptional<number>;
  declare madeAhead: CreationOptional<boolean>;
  /** Made ahead: how long it keeps. */
  declare keepsDays: number | null;
  declare skillId: string | null;
  declare formulaId: string | null;
  declare colourable: CreationOptional<boolean>;
  declare smallParts: CreationOptional<boolean>;
  declare caution: CreationOptional<string>;
  declare position: CreationOptional<number>;
  declare archivedAt: Date | null;

  declare ingredients?: NonAttribute<DecorationIngredient[]>;
}

export function initDecoration(sequelize: Sequelize): void {
  Decoration.init(
    {
      id: { ...text(), primaryKey: true },
      name: text(),
      blurb: withDefault(text(), ''),
      glyph: oneOf(glyphs),
      edge: oneOf(decorationEdge.options),
      sources: json('sources', sourceList),
      detail: oneOf(detail.options),
      per: oneOf(decorationPers),
      minutes: integer(),
      materialsCostMinor: withDefault(integer(), 0),
      weightMg: integer(),
      arriveByHours: nullable(integer()),
      noticeDays: withDefault(integer(), 0),
      madeAhead: withDefault(flag('madeAhead'), false),
      keepsDays: nullable(integer()),
      skillId: nullable(text()),
      formulaId: nullable(text()),
      colourable: withDefault(flag('colourable'), false),
      smallParts: withDefault(flag('smallParts'), false),
      caution: withDefault(text(), ''),
      position: withDefault(integer(), 0),
      archivedAt: nullable(instant('archivedAt')),
    },
    { sequelize, tableName: 'decorations' },
  );
}
