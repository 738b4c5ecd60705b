import { findWholeName } from './match-part.ts';
import type { PantryIndex } from './pantry-index.ts';
import { amountMark, nameMark, readAmounts } from './read-amounts.ts';
import type { PartCandidate, ReadAmount } from './typed-line.ts';

export type TakenApart = {
  readonly amounts: readonly ReadAmount[];
  readonly words: string;
  readonly note: string | null;
  /** The part whose whole name stands in the line, if one does. */
  readonly named: PartCandidate | null;
  /** `5 egg whites + a pinch of salt`: an amount of something else is added on the same line. */
  readonly more: boolean;
};

/** A line without its bullet, tick box or number, and without characters nobody sees. */
export function bareLine(asTyped: string): string {
  return asTyped
    .replace(/\p{Cc}/gu, ' ')
    .trim()
    .replace(/^(?:[-–—*•·▪◦]\s+|[☐☑✓✔□■]\s*|\[[x ]?\]\s*|\d+[.)]\s+(?=[\d¼½¾⅓⅔⅛]))+/iu, '')
    .trim();
}

/** `For the custard`, `Custard:`, `# Custard`; null for a line that is none. */
export function headingOf(text: string): string | null {
  const marked = /^#+\s*(\D.*)$/u.exec(text)?.[1];
  const starred = /^(?:\*\*|__)([^*_]*\p{L}[^*_]*)(?:\*\*|__)$/u.exec(marked ?? text)?.[1];
  const unmarked = (starred ?? marked ?? text).trim();
  const ended = /^(.*\p{L}.*?)\s*:$/u.exec(unmarked)?.[1];
  if (ended !== undefined) return ended;
  if (marked !== undefined || starred !== undefined) return unmarked;
  return /^for (?:the )?\p{L}[\p{L}\s'’-]*$/iu.test(unmarked) ? unmarked : null;
}

const filler = `${amountMark}${nameMark}`;
const emptied = new RegExp(
  `[(\\[](?:[\\s${filler},;/=~≈+&-]|about|approx(?:imately|\\.)?|roughly|or|and|ca\\.|total)*[)\\]]`,
  'giu',
);
const leading =
  /^(?:(?:of|about|approx(?:imately)?|circa|ca|roughly|or|and|plus)\b\.?|[-–—,:;/.=~≈+&*•\s])+/iu;
const trailing =
  /(?:(?<=\s)(?:of|about|approx(?:imately)?|circa|ca|roughly|or|and|plus)\.?|[-–—,:;/.…*=~≈+&\s])+$/iu;

/** What is left of a line without its amounts: what it is, and what is said of it. */
function wordsAndNote(rest: string): { words: string; note: string | null } {
  const notes: string[] = [];
  const unmarked = rest
    .replace(emptied, ' ')
    .replaceAll(amountMark, ' , ')
    .replaceAll(nameMark, ' ')
    .replace(/\(([^()]*)\)/gu, (_, inner: string) => {
      const note = tidy(inner);
      if (note !== '') notes.push(note);
      return ' ';
    })
    .replace(/\s+/gu, ' ');
  const [words = '', ...after] = tidy(unmarked).split(/\s*[,;]\s*/u);
  notes.unshift(...after.map(tidy).filter((it) => it !== ''));
  return { words: tidy(words), note: notes.length === 0 ? null : notes.join(', ') };
}

const tidy = (text: string) => text.replace(leading, '').replace(trailing, '').trim();

/**
 * A bare line in its amounts, its words and its note. A part's whole name is looked for first,
 * because names hold commas and figures of their own ("Unsalted butter, 82 % fat").
 */
export function takeApart(text: string, index: PantryIndex): TakenApart {
  const named = takeNamed(text, index);
  if (named !== null) return named;
  const { amounts, rest } = readAmounts(text);
  return { amounts, ...wordsAndNote(rest), named: null, more: addsMore(rest) };
}

const added = new RegExp(
  `[\\p{L}${nameMark})]\\s*(?:\\+|&|\\bplus\\b|\\band\\b)\\s*${amountMark}\\s*(?:of\\s+)?[\\p{L}${nameMark}]`,
  'iu',
);
const addsMore = (rest: string) => added.test(rest);

const afterName = new RegExp(`^\\s*(?:$|[,;:(–—${amountMark}-])`, 'u');

/** Only where nothing but amounts stands before the name and a note at most behind it. */
function takeNamed(text: string, index: PantryIndex): TakenApart | null {
  const whole = findWholeName(text, index);
  if (whole === null) return null;
  const { amounts, rest } = readAmounts(
    text.slice(0, whole.from) + nameMark + text.slice(whole.to),
  );
  const at = rest.indexOf(nameMark);
  const before = wordsAndNote(rest.slice(0, at));
  const behind = rest.slice(at + nameMark.length);
  if (before.words !== '' || !afterName.test(behind)) return null;
  const after = wordsAndNote(behind);
  const notes = [before.note, after.words, after.note].filter((it) => it !== null && it !== '');
  return {
    amounts,
    words: text.slice(whole.from, whole.to),
    note: notes.length === 0 ? null : notes.join(', '),
    named: whole.candidate,
    more: addsMore(rest),
  };
}
