import type { FormulaLine, FormulaVersion } from '#shared/contracts/pantry.ts';
import type { AllergenEntry } from '#shared/contracts/menu.ts';
import type { LabelRegion } from '#shared/contracts/vocabulary.ts';
import { formatList } from '#shared/dates/format.ts';
import { allergenLabel } from '#shared/kitchen/allergen-names.ts';
import type { TemperatureLead } from '#shared/kitchen/measures.ts';
import { contentFacts, type ContentFact } from '#shared/kitchen/order-contents.ts';
import { checkFormula } from './check-formula.ts';
import { compareMethods } from './compare-methods.ts';
import { formulaContents } from './formula-contents.ts';
import { formulaCost } from './formula-cost.ts';
import { resolvePart, versionName, type PantryIndex } from './pantry-index.ts';
import { formulaTotals } from './totals.ts';

/** One thing that is different between two versions, in words. */
export type VersionChange = {
  readonly kind:
    | 'line'
    | 'step'
    | 'order'
    | 'yield'
    | 'keeping'
    | 'limit'
    | 'look'
    | 'note'
    | 'contents'
    | 'cost';
  readonly text: string;
};

/** How the studio says allergens and temperatures. */
export type CompareWords = { readonly region?: LabelRegion; readonly lead?: TemperatureLead };

/**
 * What a later version does otherwise than an earlier one, most telling first: what is in it,
 * what that means for allergens and cost, how it is made, how it keeps. The later one may be an
 * unsaved draft; what of it is unsound is left to `checkFormula`.
 */
export function compareVersions(
  before: FormulaVersion,
  after: FormulaVersion,
  index: PantryIndex,
  { region = 'US', lead = 'F' }: CompareWords = {},
): VersionChange[] {
  const sound = [before, after].every((it) => checkFormula(it, index).length === 0);
  return [
    ...lineChanges(before, after, index),
    ...(sound ? contentChanges(before, after, index, region) : []),
    ...(sound ? costChange(before, after, index) : []),
    ...compareMethods(before, after, lead),
  ];
}

/** To the milligram: a change must never read like none. */
function exactGrams(grams: number): string {
  const kilograms = grams >= 10_000;
  return `${Number((kilograms ? grams / 1000 : grams).toFixed(3))} ${kilograms ? 'kg' : 'g'}`;
}

const line = (text: string): VersionChange => ({ kind: 'line', text });
const percent = (ratio: number) => `${Number((Math.abs(ratio - 1) * 100).toPrecision(2))} %`;
/** Weights differ when somebody wrote another; the dust of kept milligrams is none. */
const alike = (a: number, b: number) => Math.abs(a - b) < 0.0005 + 1e-9 * Math.max(a, b);

type Pair = { readonly before: FormulaLine; readonly after: FormulaLine };
type Paired = {
  readonly pairs: readonly Pair[];
  readonly added: readonly FormulaLine[];
  readonly removed: readonly FormulaLine[];
};

/** The same ingredient, or the same formula in whatever version; the first with the first. */
function pairLines(before: FormulaVersion, after: FormulaVersion, index: PantryIndex): Paired {
  const keyOf = ({ part }: FormulaLine) =>
    part.kind === 'ingredient'
      ? part.ingredientId
      : `@${index.versions.get(part.formulaVersionId)?.formulaId ?? part.formulaVersionId}`;
  const open = [...before.lines];
  const pairs: Pair[] = [];
  const added: FormulaLine[] = [];
  for (const it of after.lines) {
    const at = open.findIndex((old) => keyOf(old) === keyOf(it));
    const [old] = at < 0 ? [] : open.splice(at, 1);
    if (old === undefined) added.push(it);
    else pairs.push({ before: old, after: it });
  }
  return { pairs, added, removed: open };
}

function lineChanges(
  before: FormulaVersion,
  after: FormulaVersion,
  index: PantryIndex,
): VersionChange[] {
  const { pairs, added, removed } = pairLines(before, after, index);
  const name = (it: FormulaLine) => resolvePart(index, it.part).name;
  const all = added.length === 0 && removed.length === 0;
  const factor = all ? commonFactor(pairs) : null;
  const oldOrder = before.lines.filter((it) => pairs.some((pair) => pair.before === it));
  const moved = pairs.some((pair, at) => pair.before !== oldOrder[at]);
  return [
    ...added.map((it) => line(`${name(it)} comes in: ${exactGrams(it.grams)}.`)),
    ...removed.map((it) => line(`${name(it)} is left out; it was ${exactGrams(it.grams)}.`)),
    ...(factor === null
      ? []
      : [line(`All lines are ${timesWords(factor)}; the proportions stay.`)]),
    ...pairs.flatMap((it) => [
      ...(factor === null ? weightChange(it, name(it.after)) : []),
      ...partChange(it, index),
      ...(it.before.step === it.after.step
        ? []
        : [
            line(
              `${name(it.after)} goes in at step ${it.after.step + 1}, not ${it.before.step + 1}.`,
            ),
          ]),
    ]),
    ...(moved ? [{ kind: 'order', text: 'The lines stand in another order.' } as const] : []),
  ];
}

function weightChange({ before, after }: Pair, name: string): VersionChange[] {
  if (alike(before.grams, after.grams)) return [];
  const more = after.grams > before.grams;
  const difference = exactGrams(Math.abs(after.grams - before.grams));
  const by = percent(after.grams / before.grams);
  return [
    line(
      `${name}: ${exactGrams(before.grams)} → ${exactGrams(after.grams)}, ` +
        `${difference} (${by}) ${more ? 'more' : 'less'}.`,
    ),
  ];
}

function partChange({ before, after }: Pair, index: PantryIndex): VersionChange[] {
  const [old, now] = [resolvePart(index, before.part), resolvePart(index, after.part)];
  if (old.kind !== 'formula' || now.kind !== 'formula' || old.version.id === now.version.id) {
    return [];
  }
  return [line(`${now.name}: version ${old.version.n} → version ${now.version.n}.`)];
}

/** Two lines or more that all grew by one factor: the same formula written larger or smaller. */
function commonFactor(pairs: readonly Pair[]): number | null {
  const [first] = pairs;
  if (first === undefined || pairs.length < 2) return null;
  const factor = first.after.grams / first.before.grams;
  if (alike(factor, 1) || !Number.isFinite(factor)) return null;
  const same = pairs.every((it) => alike(it.before.grams * factor, it.after.grams));
  return same ? factor : null;
}

const timesWords = (factor: number) =>
  factor >= 1
    ? `${Number(factor.toPrecision(3))} times as heavy`
    : `${Number((factor * 100).toPrecision(3))} % as heavy`;

const stateWords = {
  contains: (label: string) => `Now contains ${label}.`,
  'may-contain': (label: string) => `Now a maker’s label warns of ${label}.`,
  unknown: (label: string) => `Nobody knows yet whether ${label} is in it now.`,
  'not-declared': () => '',
} satisfies Record<AllergenEntry['state'], (label: string) => string>;

const factWords = {
  gelatine: 'gelatine',
  alcohol: 'alcohol',
  cochineal: 'cochineal',
  honey: 'honey',
  animalOrigin: 'something from meat, fish or slaughter',
  undercookedEgg: 'egg that is neither pasteurized nor cooked through',
} satisfies Record<ContentFact, string>;

/** What it contains now and did not before, and what is not named any more; never "free from". */
function contentChanges(
  before: FormulaVersion,
  after: FormulaVersion,
  index: PantryIndex,
  region: LabelRegion,
): VersionChange[] {
  const old = formulaContents(before, index, versionName(index, before));
  const now = formulaContents(after, index, versionName(index, after));
  const said = (it: AllergenEntry) => `${it.state} ${allergenLabel(it, region)}`;
  const known = new Set(old.allergens.map(said));
  const still = new Set(now.allergens.map(said));
  const gained = now.allergens.filter((it) => !known.has(said(it)));
  const lost = old.allergens.filter((it) => !still.has(said(it)));
  const texts = gained.map((it) => stateWords[it.state](allergenLabel(it, region)));
  if (lost.length > 0) {
    const labels = formatList(lost.map((it) => allergenLabel(it, region)));
    texts.push(`Its labels do not name ${labels} any more in the way they did.`);
  }
  for (const fact of contentFacts) {
    if (old[fact] === now[fact]) continue;
    texts.push(
      now[fact]
        ? `Now has ${factWords[fact]} in it, or a label that does not rule it out.`
        : `Its labels do not name ${factWords[fact]} any more.`,
    );
  }
  return texts.map((text) => ({ kind: 'contents', text }));
}

/** A thousandth of the cost is nothing to speak of. */
const leastCostRatio = 0.001;

function costChange(
  before: FormulaVersion,
  after: FormulaVersion,
  index: PantryIndex,
): VersionChange[] {
  const [old, now] = [formulaCost(before, index), formulaCost(after, index)];
  const cost = (text: string): VersionChange[] => [{ kind: 'cost', text }];
  if (now.perKgOutMinor === null) {
    if (old.perKgOutMinor === null) return [];
    const names = formatList(now.unpriced.map((it) => it.name));
    return cost(`What it costs is not known any more: no price for ${names}.`);
  }
  if (old.perKgOutMinor === null) return cost('What it costs is known now.');
  if (old.perKgOutMinor === 0) return [];
  const ratio = now.perKgOutMinor / old.perKgOutMinor;
  if (Math.abs(ratio - 1) < leastCostRatio) return [];
  const way = ratio > 1 ? 'more' : 'less';
  const { inG } = formulaTotals(after);
  return inG > 0 ? cost(`The ingredients of a kilogram cost ${percent(ratio)} ${way}.`) : [];
}
