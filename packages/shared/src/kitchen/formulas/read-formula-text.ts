import type { FormulaPart } from '#shared/contracts/pantry.ts';
import { formatGrams, isVolume } from './household.ts';
import { matchPart, type MatchedPart } from './match-part.ts';
import { resolvePart, type PantryIndex } from './pantry-index.ts';
import { proofread } from './proofread.ts';
import { toStep } from './round-grams.ts';
import { bareLine, headingOf, takeApart } from './take-apart.ts';
import type { AmountUnit, ReadAmount, ReadFormula, ReadLine, WeighedAmount } from './typed-line.ts';
import { weighAmount, type WeighedThing } from './weigh-amount.ts';

/** What is known of a line beside its words. */
export type LineAsked = {
  /** Headings before it. */
  readonly stage?: number;
  /** The part somebody picked for it: it stands whatever the words say. */
  readonly part?: FormulaPart;
};

/** The contract keeps a line of this length as it was typed. */
const longest = 200;

/** One line as a baker types it: `1 1/2 cups milk, 340 g`. What was typed is always kept. */
export function readFormulaLine(
  asTyped: string,
  index: PantryIndex,
  { stage = 0, part }: LineAsked = {},
): ReadLine {
  const text = bareLine(asTyped);
  const unread = { ...nothingRead, asTyped, stage, words: text };
  if (text === '') return { ...unread, kind: 'blank' };
  // Before anything looks at it: whole books get pasted, and patterns take their time on them.
  if (text.length > longest) {
    const message = `Too long to be read: at most ${longest} characters on a line.`;
    return { ...unread, kind: 'line', problem: { code: 'not-read', message } };
  }
  const heading = part === undefined ? headingOf(text) : null;
  if (heading !== null) return { ...unread, kind: 'heading', words: heading };

  const { amounts, words, note, named, more } = takeApart(text, index);
  const counted = amounts.some((it) => it.parts.some(({ unit }) => unit === 'piece'));
  const found =
    part !== undefined
      ? picked(part, index)
      : named !== null
        ? only(named)
        : matchPart(words, note, counted, index);
  const { match, candidates } = found;
  if (amounts.length === 0 && !found.fits && isShouted(text)) return { ...unread, kind: 'heading' };
  const thing = match === null ? null : thingOf(match.part, index);
  const said = qualifierOf(words, note);
  const weighed = amounts.map((it) => weighAmount(qualified(it, said), thing));
  const taken = amountTaken(weighed);
  // To the milligram, which is what is kept: the dust of floating point is nobody's weight.
  const grams = taken === null || taken.grams === null ? null : toStep(taken.grams, 0.001);
  return {
    asTyped,
    kind: 'line',
    stage,
    amounts: weighed,
    words,
    note,
    match,
    candidates,
    grams: grams !== null && grams > 0 ? grams : null,
    reckoned: taken?.reckoned ?? false,
    decided: taken === null ? null : decidedOf(taken),
    problem: more ? twoThings : problemOf({ text, words, weighed, grams, found }),
    findings: proofread(weighed, thing),
  };
}

/** A whole formula as a baker types it, headings as stages; no line is lost or changed. */
export function readFormulaText(text: string, index: PantryIndex): ReadFormula {
  const stages: string[] = [];
  const lines = text.split(/\r\n|\r|\n/u).map((typed) => {
    const line = readFormulaLine(typed, index, { stage: stages.length });
    if (line.kind === 'heading') stages.push(line.words);
    return line;
  });
  return { lines, stages };
}

/** A line as it is read back to the same part and grams: `340 g Whole milk`. */
export function formatLine(grams: number, name: string): string {
  return `${Number(grams.toFixed(3))} g ${name}`;
}

const nothingRead = {
  amounts: [],
  note: null,
  match: null,
  candidates: [],
  grams: null,
  reckoned: false,
  decided: null,
  problem: null,
  findings: [],
} as const;

/**
 * "Sifted powdered sugar" is sifted before it is measured, "powdered sugar, sifted" after (common
 * practice, no source); packed and unsifted speak of the measure wherever they stand.
 */
function qualifierOf(words: string, note: string | null): string | null {
  const before = /\b(unsifted|sifted|packed)\b/iu.exec(words)?.[1];
  const after = /\b(unsifted|packed)\b/iu.exec(note ?? '')?.[1];
  return (before ?? after)?.toLowerCase() ?? null;
}

function qualified(amount: ReadAmount, qualifier: string | null): ReadAmount {
  if (qualifier === null) return amount;
  const parts = amount.parts.map((it) =>
    it.qualifier === null && isVolume(it.unit) ? { ...it, qualifier } : it,
  );
  return { ...amount, parts };
}

const only = (match: NonNullable<MatchedPart['match']>): MatchedPart => ({
  match,
  candidates: [match],
  fits: true,
});

function picked(part: FormulaPart, index: PantryIndex): MatchedPart {
  const resolved = resolvePart(index, part);
  return resolved.kind === 'missing'
    ? { match: null, candidates: [], fits: false }
    : only({ part, name: resolved.name });
}

function thingOf(part: FormulaPart, index: PantryIndex): WeighedThing {
  const resolved = resolvePart(index, part);
  return resolved.kind === 'missing' ? null : resolved;
}

/** Grams before ounces before packs and pieces before volumes before what is only reckoned. */
const surest: readonly (readonly AmountUnit[])[] = [
  ['milligram', 'gram', 'kilogram'],
  ['ounce', 'pound'],
  ['can', 'stick', 'piece'],
];

function amountTaken(amounts: readonly WeighedAmount[]): WeighedAmount | null {
  const known = amounts.filter((it) => it.grams !== null);
  for (const units of surest) {
    const found = known.find(
      (it) => !it.reckoned && it.parts.every(({ unit }) => units.includes(unit)),
    );
    if (found !== undefined) return found;
  }
  return known.find((it) => !it.reckoned) ?? known[0] ?? null;
}

/**
 * Of a range the middle is taken: what is bought and priced is then right on average, and the
 * baker sees that it was decided and can write another. A point before three figures is a decimal
 * point, which is said because elsewhere it parts thousands.
 */
function decidedOf({ typed, parts, grams }: WeighedAmount): string | null {
  if (grams === null) return null;
  if (parts.some((it) => it.least !== it.most)) {
    return `${typed}: the middle, ${formatGrams(grams)}, is taken.`;
  }
  const thousands = /^[1-9]\d{0,2}\.\d{3}\s*(?:g|gr|grams?|ml)\b/iu.test(typed);
  return thousands ? `${typed} is read as ${formatGrams(grams)}, not as thousands.` : null;
}

/** `FILLING`: capitals alone, which name nothing on the shelf. */
const isShouted = (text: string) => /^[\p{Lu}\s'’-]{3,40}$/u.test(text);

const twoThings = {
  code: 'two-things',
  message: 'More than one thing on this line: write each on a line of its own.',
} as const;

const asYouLike = /\b(?:to taste|as needed|as required|q\.?\s?s\b)/iu;

function problemOf({
  text,
  words,
  weighed,
  grams,
  found: { match, fits },
}: {
  readonly text: string;
  readonly words: string;
  readonly weighed: readonly WeighedAmount[];
  readonly grams: number | null;
  readonly found: MatchedPart;
}): ReadLine['problem'] {
  const name = match?.name ?? words;
  if (weighed.length === 0) {
    if (asYouLike.test(text)) {
      return { code: 'to-taste', message: `Write how much ${name}: a formula weighs everything.` };
    }
    if (negative.test(text)) return nothingOf(name);
    return match === null
      ? { code: 'not-read', message: 'This line could not be read; it is kept as it was typed.' }
      : { code: 'no-amount', message: `Write how much ${name}.` };
  }
  if (match === null) {
    if (words === '') return { code: 'unknown-part', message: 'Write what it is.' };
    return fits
      ? { code: 'which-part', message: `Choose which one “${words}” is.` }
      : { code: 'unknown-part', message: `Nothing in the pantry is called “${words}”.` };
  }
  if (grams === null) {
    const [first] = weighed;
    const message = `It is not known what ${first?.typed ?? 'this'} of ${name} weighs. Write the grams.`;
    return { code: 'no-weight', message };
  }
  return grams > 0 ? null : nothingOf(name);
}

const negative = /(?:^|\s)[-−]\s?[\d.,¼½¾⅓⅔⅛]+\s*\p{L}/u;
const nothingOf = (name: string) =>
  ({ code: 'no-amount', message: `Write how much ${name}: more than nothing.` }) as const;
