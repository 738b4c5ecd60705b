import type { EggPart, HouseholdMeasure, IngredientFamily } from '#shared/contracts/pantry.ts';
import type {
  AllergenId,
  AllergenState,
  DecorationSource,
  Detail,
  StyleId,
} from '#shared/contracts/vocabulary.ts';

/** One allergen on the label of a bought product, as it was read on the day it was checked. */
export type SeedAllergen = {
  readonly allergen: AllergenId;
  readonly species?: readonly string[];
  readonly state: AllergenState;
};

/** What else a label tells that matters at somebody's table; absent means no. */
export type SeedTrait = 'gelatine' | 'alcohol' | 'cochineal' | 'animal-origin' | 'honey';

/** A bought product. Weights in grams, prices in US cents. */
export type SeedIngredient = {
  readonly id: string;
  readonly family: IngredientFamily;
  /** The maker, invented; null for what has none. */
  readonly brand: string | null;
  /** As it stands on the shelf. */
  readonly name: string;
  /** As it stands in an ingredient statement, 21 CFR 101.4(a)(1). */
  readonly commonName: string;
  /** For compound products: their own ingredients, in parentheses, 21 CFR 101.4(b)(2). */
  readonly madeOf?: string;
  readonly packG: number;
  readonly packPriceMinor: number;
  readonly allergens: readonly SeedAllergen[];
  readonly traits?: readonly SeedTrait[];
  readonly egg?: { readonly part: EggPart; readonly pasteurised: boolean };
  /** What the kitchen weighs it to, grams; 1 where it is not told. */
  readonly roundingG?: number;
  /** Liquids, so that a recipe may give them by volume. */
  readonly densityGPerMl?: number;
  /** Number of the food in USDA SR28, where its household weights are from. */
  readonly ndb?: string;
  readonly measures?: readonly {
    readonly measure: HouseholdMeasure;
    readonly qualifier?: string;
    readonly grams: number;
    /** Only where it is not the food's table. */
    readonly source?: string;
  }[];
};

/** `step` is the one it goes in at, from 0, where it is not the first: heat before it does not reach it. */
export type SeedLine = {
  readonly grams: number;
  readonly step?: number;
  /** As the baker typed it. */
  readonly typed?: string;
} & ({ readonly ingredient: string } | { readonly formula: string });

export type SeedStep = {
  readonly text: string;
  readonly activeMinutes: number;
  readonly waitingMinutes: number;
  readonly resource: 'bench' | 'mixer' | 'oven' | 'cold';
  /** A limit to be measured and logged: reached, or come down to within `seconds`. */
  readonly critical?: { readonly note: string; readonly limitC: number; readonly seconds?: number };
  /** Soft ball and the like, at sea level; the bench corrects it for altitude. */
  readonly syrupTargetC?: number;
};

export type SeedFormulaKind = 'sponge' | 'filling' | 'buttercream' | 'custard' | 'other';

/** A recipe by weight. `yieldPpm` is what is left of what goes in, parts per million. */
export type SeedFormula = {
  readonly id: string;
  readonly name: string;
  readonly kind: SeedFormulaKind;
  readonly lines: readonly SeedLine[];
  readonly yieldPpm: number;
  /** Sponges only; part of what the yield says, kept apart for the tins. */
  readonly bakeLossPpm?: number;
  readonly densityGPerMl: number;
  readonly chilledHours: number;
  readonly roomHours: number;
  readonly frozenDays: number;
  readonly holdsToC: number;
  readonly colour: string;
  readonly refrigerate: boolean;
  readonly steps: readonly SeedStep[];
  /** What was changed in this version, for who reads the older one. */
  readonly note?: string;
  /** Versions from before, oldest first: what was otherwise in them. */
  readonly earlier?: readonly Partial<
    Pick<SeedFormula, 'lines' | 'steps' | 'yieldPpm' | 'densityGPerMl' | 'chilledHours' | 'note'>
  >[];
};

export type SeedSponge = {
  readonly id: string;
  readonly name: string;
  readonly blurb: string;
  readonly formula: string;
  readonly levellingPpm: number;
};

export type SeedFilling = {
  readonly id: string;
  readonly name: string;
  readonly blurb: string;
  readonly formula: string;
  readonly thicknessMm: number;
  readonly soft: boolean;
};

export type SeedStyle = {
  readonly id: StyleId;
  readonly name: string;
  readonly blurb: string;
  readonly how: string;
  readonly bestFor: string;
  readonly formula: string;
  readonly sweetness: number;
  readonly smoothness: number;
  readonly detail: Detail;
  readonly crusts: boolean;
};

export type SeedDecoration = {
  readonly id: string;
  readonly name: string;
  readonly blurb: string;
  readonly glyph:
    | 'flower'
    | 'leaf'
    | 'pearl'
    | 'border'
    | 'figure'
    | 'topper'
    | 'fruit'
    | 'drip'
    | 'print'
    | 'ribbon'
    | 'sprinkle';
  readonly edge: 'edible' | 'food-contact-only' | 'remove-before-eating';
  readonly sources: readonly DecorationSource[];
  readonly detail: Detail;
  readonly per: 'piece' | 'tier' | 'cake';
  readonly minutes: number;
  readonly materialsCostMinor: number;
  readonly madeAhead: boolean;
  readonly keepsDays: number | null;
  readonly arriveByHours: number | null;
  readonly colourable: boolean;
  readonly skill: string | null;
  readonly noticeDays: number;
  readonly weightG: number;
  readonly caution: string;
  readonly smallParts: boolean;
  /** What it is made of, grams each; empty for what is not food. */
  readonly lines: readonly SeedLine[];
};
