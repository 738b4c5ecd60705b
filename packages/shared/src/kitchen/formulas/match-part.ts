import type { FormulaPart, Ingredient } from '#shared/contracts/pantry.ts';
import { nameWords, nearlySame, sameName, tellingWords } from './match-words.ts';
import type { PantryIndex } from './pantry-index.ts';
import type { PartCandidate } from './typed-line.ts';

/** A part that is still bought or made, with the words it may be called by. */
type Shelved = {
  readonly candidate: PartCandidate;
  readonly ingredient: Ingredient | null;
  /** Its name as it stands, in lower case. */
  readonly name: string;
  /** Names it is known by in full: on the shelf, with its brand, on a label. */
  readonly names: readonly string[];
  readonly label: ReadonlySet<string>;
  readonly words: ReadonlySet<string>;
};

export type MatchedPart = {
  readonly match: PartCandidate | null;
  readonly candidates: readonly PartCandidate[];
  /** Whether the first candidate has every telling word; without, none is quite what was typed. */
  readonly fits: boolean;
};

const kept = new WeakMap<PantryIndex, readonly Shelved[]>();

function shelvedOf(index: PantryIndex): readonly Shelved[] {
  const before = kept.get(index);
  if (before !== undefined) return before;
  const shelved: Shelved[] = [];
  for (const it of index.ingredients.values()) {
    if (it.archivedAt !== null) continue;
    const part: FormulaPart = { kind: 'ingredient', ingredientId: it.id };
    const egg = it.eggPart === null ? [] : ['egg', it.eggPart];
    const treated = it.pasteurised === 'yes' ? ['pasteurized', 'pasteurised'] : [];
    shelved.push({
      candidate: { part, name: it.name },
      name: it.name.toLowerCase(),
      ingredient: it,
      names: [it.name, it.labelName, ...(it.brand === null ? [] : [`${it.brand} ${it.name}`])].map(
        sameName,
      ),
      label: new Set(nameWords(it.labelName)),
      words: new Set([
        ...nameWords(`${it.name} ${it.labelName} ${it.brand ?? ''}`),
        ...egg,
        ...treated,
      ]),
    });
  }
  for (const it of index.formulas.values()) {
    if (it.archivedAt !== null) continue;
    const part: FormulaPart = { kind: 'formula', formulaVersionId: it.currentVersionId };
    shelved.push({
      candidate: { part, name: it.name },
      name: it.name.toLowerCase(),
      ingredient: null,
      names: [sameName(it.name)],
      label: new Set(nameWords(it.name)),
      words: new Set(nameWords(it.name)),
    });
  }
  kept.set(index, shelved);
  return shelved;
}

/**
 * A part whose whole name, with all its commas and figures, stands in a typed line, and where;
 * the longest, and only where one part alone has it.
 */
export function findWholeName(
  text: string,
  index: PantryIndex,
): { readonly candidate: PartCandidate; readonly from: number; readonly to: number } | null {
  const lower = text.toLowerCase();
  const standing = shelvedOf(index)
    .filter(({ name }) => standsIn(lower, name))
    .toSorted((a, b) => b.name.length - a.name.length);
  const [longest, next] = standing;
  if (longest === undefined || longest.name === next?.name) return null;
  const from = lower.indexOf(longest.name);
  return { candidate: longest.candidate, from, to: from + longest.name.length };
}

function standsIn(text: string, name: string): boolean {
  const at = text.indexOf(name);
  if (at < 0) return false;
  const letter = /[\p{L}\p{N}]/u;
  return !letter.test(text.charAt(at - 1)) && !letter.test(text.charAt(at + name.length));
}

const most = 6;

/**
 * What of the pantry typed words mean. A match has every telling word of them and is the only one
 * that fits best; where several do, or none has all words, there are only candidates, nearest
 * first: nobody guesses between two eggs. `note` is what stands after the comma ("sugar,
 * powdered"); `counted` means whole pieces were typed, so eggs come in their shells.
 */
export function matchPart(
  words: string,
  note: string | null,
  counted: boolean,
  index: PantryIndex,
): MatchedPart {
  const asked = tellingWords(words);
  if (asked.length === 0) return { match: null, candidates: [], fits: false };
  const noted = note === null ? [] : tellingWords(note);
  const named = sameName(words);
  const rated = shelvedOf(index)
    .map((it) => rate(it, { asked, noted, named, counted }))
    .filter((it) => it.fits > 0)
    .toSorted(betterFirst);
  const [first, second] = rated;
  if (first === undefined || first.fits < asked.length) {
    return { match: null, candidates: candidatesOf(rated), fits: false };
  }
  // Where some have every word, one with half of them is no choice: whites are no yolks.
  const candidates = candidatesOf(rated.filter((it) => it.fits === asked.length));
  // A misspelt word may be another word: butter and batter are one letter apart.
  const spelt = first.exact === asked.length;
  const alone = second === undefined || second.fits < asked.length || tells(first, second);
  return { match: spelt && alone ? first.candidate : null, candidates, fits: true };
}

const candidatesOf = (rated: readonly Rated[]): readonly PartCandidate[] =>
  rated.slice(0, most).map((it) => it.candidate);

type Rated = {
  readonly candidate: PartCandidate;
  /** Telling words found, misspelt ones included; and those spelt as they are. */
  readonly fits: number;
  readonly exact: number;
  readonly noted: number;
  readonly named: number;
  readonly shell: number;
  readonly bought: number;
  readonly spare: number;
};

function rate(
  { candidate, ingredient, names, label, words }: Shelved,
  asked: {
    readonly asked: readonly string[];
    readonly noted: readonly string[];
    readonly named: string;
    readonly counted: boolean;
  },
): Rated {
  const has = (word: string) => words.has(word);
  const near = (word: string) => has(word) || [...words].some((it) => nearlySame(it, word));
  const exact = asked.asked.filter(has).length;
  const called = names.includes(asked.named);
  const labelled =
    label.size === new Set(asked.asked).size && asked.asked.every((it) => label.has(it));
  return {
    candidate,
    exact,
    fits: asked.asked.filter(near).length,
    noted: asked.noted.filter(has).length,
    named: called ? 2 : labelled ? 1 : 0,
    shell:
      asked.counted && ingredient?.measures.some((it) => it.measure === 'piece') === true ? 1 : 0,
    // "Vanilla" is sooner the extract on the shelf than one of the studio's own creams; but what
    // is bought and made under one and the same name is asked about.
    bought: ingredient === null || called ? 0 : 1,
    spare: words.size - exact,
  };
}

/** What makes one fit better than another, most telling first; spare words only put in order. */
const scales = ['fits', 'exact', 'noted', 'shell', 'named', 'bought'] as const;

function betterFirst(a: Rated, b: Rated): number {
  for (const scale of scales) if (a[scale] !== b[scale]) return b[scale] - a[scale];
  return a.spare - b.spare;
}

const tells = (first: Rated, second: Rated) =>
  scales.some((scale) => first[scale] !== second[scale]);
