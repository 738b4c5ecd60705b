const words: Readonly<Record<string, number>> = {
  one: 1,
  two: 2,
  three: 3,
  four: 4,
  five: 5,
  six: 6,
  seven: 7,
  eight: 8,
  nine: 9,
  ten: 10,
  dozen: 12,
};

const grouped = /[-\u2212]?\d{1,3}(?:[, ]\d{3})+(?!\d)(?:\.\d+)?/;
const plain = /[-\u2212]?\d+(?:[.,]\d+)?/;
const either = new RegExp(`${grouped.source}|${plain.source}`, 'g');

/**
 * A plain number as people type it: "70", "about 70 people", "1,200", "1 200", "2.5", "2,5",
 * "a dozen". A comma or space before exactly three figures parts thousands; any other comma is a
 * decimal. Null if the text says no number, or more than one.
 */
export function readNumber(text: string): number | null {
  const tidy = text.toLowerCase().replaceAll(/[\u00a0\u202f\u2009]/g, ' ');
  const [only, ...more] = tidy.match(either) ?? [];
  if (more.length > 0) return null;
  if (only === undefined) return readWord(tidy);
  const figures = grouped.test(only) ? only.replaceAll(/[, ]/g, '') : only.replace(',', '.');
  return Number(figures.replace('\u2212', '-'));
}

function readWord(text: string): number | null {
  const [only, ...more] = text.split(/[^a-z]+/).flatMap((word) => words[word] ?? []);
  return only === undefined || more.length > 0 ? null : only;
}
