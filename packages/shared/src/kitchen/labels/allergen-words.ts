import type { LabelSegment } from '#shared/contracts/cards.ts';
import type { AllergenEntry } from '#shared/contracts/menu.ts';
import type { AllergenId } from '#shared/contracts/vocabulary.ts';
import { speciesName } from '../allergen-names.ts';

/**
 * How an allergen may be named inside an ingredient's own words. A word that only sounds like one
 * is none: peanut butter is not milk (so "butter" names nothing), nor is the milk of a coconut.
 */
const words: Partial<Record<AllergenId, string>> = {
  milk: String.raw`(?<!\b(?:coconut|almond|oat|soya?|rice|cashew|hazelnut|hemp)\s)milk`,
  egg: 'eggs?',
  fish: 'fish',
  crustaceans: 'crustaceans?|shrimps?|prawns?|crabs?|lobsters?',
  molluscs: 'mollus[ck]s?|squid|mussels?|oysters?',
  peanut: 'peanuts?',
  soy: 'soya|soy|soya?beans?',
  celery: 'celery|celeriac',
  mustard: 'mustard',
  sesame: 'sesame',
  lupin: 'lupins?',
  sulphites:
    'sul(?:ph|f)ites?|sul(?:ph|f)ur dioxide|(?:meta)?bisul(?:ph|f)ites?|metabisul(?:ph|f)ites?',
};

const anyNut = 'nuts?';
const anyCereal = 'gluten';

/** Patterns that each have to be found for an entry to be named: one per species where it has any. */
function patternsOf({ allergen, species }: AllergenEntry): { label: string; pattern: RegExp }[] {
  const find = (source: string) => new RegExp(String.raw`\b(?:${source})\b`, 'giu');
  if (allergen !== 'tree-nuts' && allergen !== 'gluten-cereals') {
    return [{ label: '', pattern: find(words[allergen] ?? allergen) }];
  }
  if (species.length === 0) {
    return [{ label: '', pattern: find(allergen === 'tree-nuts' ? anyNut : anyCereal) }];
  }
  return species.map((it) => {
    const name = speciesName(it);
    const stem = allergen === 'tree-nuts' ? `${shortNut(name)}s?` : name.replace(/s$/u, 's?');
    return { label: name, pattern: find(stem) };
  });
}

/** "English walnut" is named by "walnut" in a list as well. */
function shortNut(name: string): string {
  return /walnut$/iu.test(name) ? String.raw`(?:\w+\s)?walnut` : name;
}

/**
 * An ingredient's words with its allergens standing out, Regulation (EU) 1169/2011 article 21(1):
 * the words that name one are emphasised where they stand; an allergen that the words do not name
 * is added in parentheses ("butter (milk)"). `labelOf` gives the name that is added.
 */
export function emphasise(
  ingredient: { readonly name: string; readonly madeOf: string },
  allergens: readonly AllergenEntry[],
  labelOf: (entry: AllergenEntry) => string,
): LabelSegment[] {
  const { name, madeOf } = ingredient;
  const own = madeOf === '' ? name : `${name} (${madeOf}`;
  const marks: { from: number; to: number }[] = [];
  const missing: string[] = [];
  for (const entry of allergens) {
    for (const { label, pattern } of patternsOf(entry)) {
      const hits = [...own.matchAll(pattern)];
      if (hits.length === 0) missing.push(label === '' ? labelOf(entry) : label);
      for (const hit of hits) marks.push({ from: hit.index, to: hit.index + hit[0].length });
    }
  }
  const segments = cut(own, marks);
  const added = [...new Set(missing)];
  if (added.length > 0) {
    segments.push(plain(madeOf === '' ? ' (' : '; '));
    added.forEach((it, index) => {
      if (index > 0) segments.push(plain(', '));
      segments.push({ text: it, emphasised: true });
    });
    segments.push(plain(')'));
  } else if (madeOf !== '') segments.push(plain(')'));
  return joinSegments(segments);
}

/** The text in stretches, the marked ones emphasised; overlapping marks are one. */
function cut(text: string, marks: readonly { from: number; to: number }[]): LabelSegment[] {
  const segments: LabelSegment[] = [];
  let at = 0;
  for (const { from, to } of [...marks].sort((a, b) => a.from - b.from)) {
    if (to <= at) continue;
    if (from > at) segments.push(plain(text.slice(at, from)));
    segments.push({ text: text.slice(Math.max(from, at), to), emphasised: true });
    at = to;
  }
  if (at < text.length) segments.push(plain(text.slice(at)));
  return segments;
}

export function plain(text: string): LabelSegment {
  return { text, emphasised: false };
}

/** Neighbours of one kind become one; empty ones go. */
export function joinSegments(segments: readonly LabelSegment[]): LabelSegment[] {
  const joined: LabelSegment[] = [];
  for (const { text, emphasised } of segments) {
    if (text === '') continue;
    const last = joined.at(-1);
    if (last?.emphasised === emphasised) {
      joined[joined.length - 1] = { text: last.text + text, emphasised };
    } else joined.push({ text, emphasised });
  }
  return joined;
}

/** What segments say, without how they look. */
export function textOf(segments: readonly LabelSegment[]): string {
  return segments.map((it) => it.text).join('');
}
