import * as z from 'zod/mini';
import { colourHex, id, instant, line, localDate, minor, prose, requiredLine } from './common.ts';
import { allergenEntry } from './menu.ts';
import { coveringId, styleId } from './vocabulary.ts';

/** Household measures a baker writes; each ingredient has its own weight for each. */
export const householdMeasures = [
  'cup',
  'tablespoon',
  'teaspoon',
  'stick',
  'can',
  'piece',
  'pinch',
] as const;
export const householdMeasure = z.enum(householdMeasures);
export type HouseholdMeasure = z.infer<typeof householdMeasure>;

export const ingredientFamilies = [
  'flour',
  'sugar',
  'butter',
  'fat',
  'egg',
  'dairy',
  'raising',
  'starch',
  'fruit',
  'nut',
  'chocolate',
  'flavour',
  'colour',
  'gelling',
  'salt',
  'liquid',
  'other',
] as const;
export const ingredientFamily = z.enum(ingredientFamilies);
export type IngredientFamily = z.infer<typeof ingredientFamily>;

/** What a label says; what it does not tell is `unknown`, which is never `no`. */
export const labelFact = z.enum(['yes', 'no', 'unknown']);

export const eggPart = z.enum(['whole', 'white', 'yolk']);
export type EggPart = z.infer<typeof eggPart>;

const grams = (least: number, message: string) =>
  z
    .number(message)
    .check(z.minimum(least, message), z.maximum(1_000_000, 'At most a tonne, please.'));

/** What one measure of an ingredient weighs: a cup of powdered sugar, sifted. */
export const ingredientMeasure = z.object({
  measure: householdMeasure,
  /** `sifted`, `packed`; null for the plain measure. */
  qualifier: z.nullable(line(40)),
  grams: grams(0.01, 'Weigh one and write its grams.'),
  /** Where the figure comes from: a table, or the studio's own scales. */
  source: z.nullable(line(120)),
});
export type IngredientMeasure = z.infer<typeof ingredientMeasure>;

/** What of a bought product people may edit. Weights in grams, prices in minor units. */
export const ingredientDraft = z.object({
  /** As it stands on the shelf. */
  name: requiredLine(120, 'Write what it is called on the shelf.'),
  brand: z.nullable(line(120)),
  /** Common name in an ingredient statement, 21 CFR 101.4(a)(1). */
  labelName: requiredLine(120, 'Write its common name, as a label prints it.'),
  /** What a compound product is made of, from its label; null for a simple one. */
  labelContents: z.nullable(line(1000)),
  /** Day somebody read the label; null while nobody has. */
  labelCheckedOn: z.nullable(localDate),
  family: ingredientFamily,
  /** Null while the price is unknown: its cost is then said to be unknown, never nothing. */
  pack: z.nullable(
    z.object({
      grams: grams(0.1, 'Write what the pack weighs.'),
      priceMinor: z.int('Write what the pack costs.').check(z.minimum(0, 'Write what it costs.')),
    }),
  ),
  densityGPerMl: z.nullable(
    z
      .number('Write a density as a number.')
      .check(z.minimum(0.01, 'At least 0.01 g/mL.'), z.maximum(25, 'At most 25 g/mL.')),
  ),
  /** What the kitchen weighs it to: 0.1 g for salt, 1 or 5 g for the rest. */
  roundingG: z
    .number('Write what it is weighed to, in grams.')
    .check(z.minimum(0.001, 'At least 0.001 g.'), z.maximum(1000, 'At most 1,000 g.')),
  eggPart: z.nullable(eggPart),
  pasteurised: labelFact,
  gelatine: labelFact,
  alcohol: labelFact,
  cochineal: labelFact,
  honey: labelFact,
  animalOrigin: labelFact,
  measures: z.array(ingredientMeasure).check(z.maxLength(20, 'At most 20 measures.')),
  /** One entry per allergen of the law's lists that the label tells of, unknown ones included. */
  allergens: z.array(allergenEntry).check(z.maxLength(40)),
});
export type IngredientDraft = z.infer<typeof ingredientDraft>;

export const ingredient = z.object({
  id,
  ...ingredientDraft.shape,
  archivedAt: z.nullable(instant),
});
export type Ingredient = z.infer<typeof ingredient>;

/** What a line of a formula weighs in: a bought product, or another formula in one of its versions. */
export const formulaPart = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('ingredient'), ingredientId: id }),
  z.object({ kind: z.literal('formula'), formulaVersionId: id }),
]);
export type FormulaPart = z.infer<typeof formulaPart>;

export const formulaLine = z.object({
  part: formulaPart,
  grams: grams(0.001, 'Write its weight in grams, more than nothing.'),
  /** As the baker typed it, kept beside what was made of it; null where it was entered by fields. */
  asTyped: z.nullable(line(200)),
  /** The step it goes in at, from 0: earlier heat does not reach it. */
  step: z.int().check(z.minimum(0), z.maximum(59)),
});
export type FormulaLine = z.infer<typeof formulaLine>;

export const stepResources = ['bench', 'mixer', 'oven', 'cold'] as const;
export type StepResource = (typeof stepResources)[number];

const minutes = z
  .int('Write whole minutes.')
  .check(z.minimum(0, 'Minutes cannot be negative.'), z.maximum(10_080, 'At most a week.'));
const celsius = z
  .number('Write a temperature.')
  .check(z.minimum(-40, 'At least -40 °C.'), z.maximum(300, 'At most 300 °C.'));

export const formulaStep = z.object({
  text: requiredLine(500, 'Write what is done.'),
  activeMinutes: minutes,
  waitingMinutes: minutes,
  resource: z.enum(stepResources),
  /** A limit measured on the mix itself and logged; within `seconds` where it has to come down. */
  critical: z.nullable(
    z.object({
      limitC: celsius,
      seconds: z.nullable(
        z
          .int('Write the time as “6 h” or “17 s”.')
          .check(z.minimum(0, 'Not below nothing.'), z.maximum(604_800, 'At most a week.')),
      ),
      note: line(200),
    }),
  ),
  /** Where a syrup is boiled to, °C at sea level; the bench corrects it for altitude. */
  syrupTargetC: z.nullable(celsius),
});
export type FormulaStep = z.infer<typeof formulaStep>;

const hours = z.nullable(
  z
    .int('Write whole hours.')
    .check(z.minimum(0, 'Hours cannot be negative.'), z.maximum(17_520, 'At most two years.')),
);
const ppm = z
  .int('Write a share in percent.')
  .check(z.minimum(0, 'Not below 0 %.'), z.maximum(1_000_000, 'Not over 100 %.'));

/** Everything of a formula version that a baker writes; saving it makes a version of its own. */
export const formulaDraft = z
  .object({
    lines: z
      .array(formulaLine)
      .check(z.minLength(1, 'A formula needs at least one line.'), z.maxLength(200)),
    steps: z.array(formulaStep).check(z.maxLength(60, 'At most 60 steps.')),
    /** What is left of what goes in, parts per million. */
    yieldPpm: ppm.check(z.minimum(1, 'Something must be left: more than 0 %.')),
    /** Of the finished sponge, filling or frosting. */
    densityGPerMl: z
      .number('Write what a milliliter weighs, or weigh a level cup.')
      .check(z.minimum(0.01, 'At least 0.01 g/mL.'), z.maximum(25, 'At most 25 g/mL.')),
    /** Sponges: what baking takes; part of what the yield says, kept apart for the tins. */
    bakeLossPpm: ppm.check(z.maximum(900_000, 'At most 90 %.')),
    baseColour: z.nullable(colourHex),
    keepsRoomHours: hours,
    keepsChilledHours: hours,
    keepsFrozenHours: hours,
    holdsToC: z.nullable(celsius),
    /** Needs cold holding unless the owner has a tested reason or the authority's word otherwise. */
    refrigerate: z.boolean(),
    /** Syrup methods take pasteurised egg unless the mix itself is measured. */
    pasteurisedByDefault: z.boolean(),
    note: prose(2000),
  })
  .check(
    z.refine((it) => it.lines.every((l) => l.step < Math.max(1, it.steps.length)), {
      message: 'A line goes in at a step that is not there.',
      path: ['lines'],
    }),
  );
export type FormulaDraft = z.infer<typeof formulaDraft>;

export const formulaKinds = ['sponge', 'filling', 'buttercream', 'custard', 'other'] as const;
export const formulaKind = z.enum(formulaKinds);
export type FormulaKind = z.infer<typeof formulaKind>;

/** One version as it stands for good. */
export const formulaVersion = z.object({
  id,
  formulaId: id,
  n: z.int(),
  ...formulaDraft.shape,
  createdAt: instant,
  /** Who wrote it; empty for what the studio began with. */
  createdBy: z.string(),
});
export type FormulaVersion = z.infer<typeof formulaVersion>;

export const formula = z.object({
  id,
  kind: formulaKind,
  name: requiredLine(120, 'Give the formula a name.'),
  currentVersionId: id,
  archivedAt: z.nullable(instant),
});
export type Formula = z.infer<typeof formula>;

/** Which formula is behind what the menu sells, by the ids the menu uses. */
export const partFormulas = z.object({
  sponges: z.record(z.string(), id),
  fillings: z.record(z.string(), id),
  styles: z.partialRecord(styleId, id),
  /** Fondant and ganache; a covering of buttercream alone has none of its own. */
  coverings: z.partialRecord(coveringId, id),
  decorations: z.record(
    z.string(),
    z.object({
      formulaId: z.nullable(id),
      /** Grams of each bought ingredient in one of them. */
      ingredients: z.array(z.object({ ingredientId: id, grams: z.number() })),
      /** Wires, ribbons, what is not weighed: the owner's figure. */
      materialsCostMinor: minor,
    }),
  ),
});
export type PartFormulas = z.infer<typeof partFormulas>;

/**
 * `GET /api/pantry`: the whole pantry, for bakers. Editor, needs, eggs and cost are worked out
 * from it by the same pure rules on both sides. `versions` holds every version there is.
 */
export const pantry = z.object({
  version: z.string(),
  currency: z.string(),
  /** The studio's height above the sea, metres: syrup boils lower up there. */
  altitudeM: z.int(),
  ingredients: z.array(ingredient),
  formulas: z.array(formula),
  versions: z.array(formulaVersion),
  parts: partFormulas,
  /** Mixers, smallest first: how many grams of a mix one takes at once. */
  mixers: z.array(z.object({ id, name: z.string(), capacityG: z.number() })),
  can: z.object({ save: z.boolean(), seeCost: z.boolean() }),
});
export type Pantry = z.infer<typeof pantry>;

/** `POST /api/pantry/formulas`: a formula and its first version. */
export const createFormula = z.object({
  kind: formulaKind,
  name: requiredLine(120, 'Give the formula a name.'),
  draft: formulaDraft,
});
export type CreateFormula = z.infer<typeof createFormula>;

/**
 * `POST /api/pantry/formulas/:id/versions`: the next version; refused with `changed-meanwhile`
 * where somebody else has made one since `basedOn`.
 */
export const saveFormula = z.object({
  basedOn: id,
  name: requiredLine(120, 'Give the formula a name.'),
  draft: formulaDraft,
  /**
   * Formulas that hold an older version of this one, straight or inside others: each gets a next
   * version of its own with the newest inside. Nothing is carried into those left out.
   */
  carryInto: z.optional(z.array(id).check(z.maxLength(200))),
  /**
   * A substitution: open orders that are not ready yet and keep an older version take the new one.
   * Left out, they are made with the version they were ordered with.
   */
  inOpenOrders: z.optional(z.boolean()),
});
export type SaveFormula = z.infer<typeof saveFormula>;

/** What making a formula, or a version of one, did. */
export const savedFormula = z.object({
  formula,
  version: formulaVersion,
  /** New versions of the formulas it was carried into. */
  carried: z.array(formulaVersion),
  /** Orders that contain something else than the customer was told: numbers. */
  touched: z.array(z.int()),
});
export type SavedFormula = z.infer<typeof savedFormula>;

/** `POST /api/pantry/ingredients`, `PUT /api/pantry/ingredients/:id`. */
export const saveIngredient = z.object({
  /** The ingredient as the client last saw it; null for a new one. */
  basedOn: z.nullable(ingredientDraft),
  draft: ingredientDraft,
});
export type SaveIngredient = z.infer<typeof saveIngredient>;

/** What saving a changed label did to orders that are not handed over yet. */
export const savedIngredient = z.object({
  ingredient,
  /** Orders whose allergens are others than the customer was told: numbers. */
  touched: z.array(z.int()),
});
export type SavedIngredient = z.infer<typeof savedIngredient>;

/** What still uses a formula or an ingredient, with the refusal `still-used`: `facts.usedBy`. */
export const usedBy = z.object({
  kind: z.enum(['formula', 'sponge', 'filling', 'style', 'covering', 'decoration']),
  id,
  name: z.string(),
});
export type UsedBy = z.infer<typeof usedBy>;
