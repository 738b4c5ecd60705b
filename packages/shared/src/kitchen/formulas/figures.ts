import { vulgarFractions } from '#shared/kitchen/measures.ts';

/** A number, or two of a range, at the start of a text; what follows it is left in `rest`. */
export type Figure = { readonly least: number; readonly most: number; readonly rest: string };

const counted: Readonly<Record<string, number>> = {
  a: 1,
  an: 1,
  half: 0.5,
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
  eleven: 11,
  twelve: 12,
};

const glyphs = Object.keys(vulgarFractions).join('');
/** `1 1/2`, `1-1/2`, `1½`, `1/2`, `½`: alternatives before plain figures, longest first. */
const mixed = /^(\d+)(?:\s+|\s*-\s*|\s+and\s+)(\d+)\s*[/⁄]\s*(\d+)(?![\d/])/u;
const mixedGlyph = new RegExp(`^(\\d+)?\\s*(?:and\\s+)?([${glyphs}])`, 'u');
const fraction = /^(\d+)\s*[/⁄]\s*(\d+)(?![\d/])/u;
/** `1,250`, `1,250.5`, `12'500`, and with thin or no-break spaces. */
const thousands = /^(\d{1,3}(?:[,'’\u00a0\u2009\u202f]\d{3})+)(\.\d+)?(?!\d)/u;
/** `1 250 g` with a plain space, but not `1 400 g can`, which is one can of 400 g. */
const spacedThousands = /^(\d{1,3} \d{3})(?=\s*(?:g|gr|grams?|ml)\b(?!\s*(?:can|tin)))/iu;
const decimal = /^(\d+)(?:[.,](\d+))?|^[.,](\d+)/u;
const word =
  /^(half an?|half|an?|one|two|three|four|five|six|seven|eight|nine|ten|eleven|twelve)(?: and an? half)?(?=\s)/iu;

type Number_ = { readonly value: number; readonly rest: string };

/** One number as people write it; null where the text starts with none. */
function readNumber(text: string): Number_ | null {
  const take = (match: RegExpExecArray, value: number): Number_ | null =>
    Number.isFinite(value) ? { value, rest: text.slice(match[0].length) } : null;

  const whole = mixed.exec(text);
  // `2-1/2` is two and a half; `2-5/2` is neither that nor a range.
  if (whole !== null && Number(whole[2]) < Number(whole[3])) {
    return take(whole, Number(whole[1]) + Number(whole[2]) / Number(whole[3]));
  }
  const glyph = mixedGlyph.exec(text);
  if (glyph !== null) {
    return take(glyph, Number(glyph[1] ?? 0) + (vulgarFractions[glyph[2] ?? ''] ?? Number.NaN));
  }
  const part = fraction.exec(text);
  if (part !== null) return take(part, Number(part[1]) / Number(part[2]));
  const large = thousands.exec(text);
  // `0,250 kg` is a quarter: no thousand starts with nothing.
  if (large !== null && !/^0/u.test(text)) {
    return take(large, Number((large[1] ?? '').replace(/\D/gu, '') + (large[2] ?? '')));
  }
  const spaced = spacedThousands.exec(text);
  if (spaced !== null) return take(spaced, Number((spaced[1] ?? '').replace(' ', '')));
  const plain = decimal.exec(text);
  if (plain !== null) return take(plain, Number(`${plain[1] ?? 0}.${plain[2] ?? plain[3] ?? 0}`));
  const said = word.exec(text);
  if (said === null) return null;
  const [first = ''] = (said[1] ?? '').toLowerCase().split(' ');
  const half = / and an? half$/iu.test(said[0]) ? 0.5 : 0;
  return take(said, (counted[first] ?? Number.NaN) + half);
}

/** `8-10`, `8 – 10`, `15 to 45`, `2 or 3`. */
const through = /^\s*(?:-|–|—|to\b|or\b)\s*/iu;

/** A number or a range as people write it; null where the text starts with none. */
export function readFigure(text: string): Figure | null {
  const first = readNumber(text);
  if (first === null) return null;
  const between = through.exec(first.rest);
  const second = between === null ? null : readNumber(first.rest.slice(between[0].length));
  if (second !== null && second.value > first.value) {
    return { least: first.value, most: second.value, rest: second.rest };
  }
  return { least: first.value, most: first.value, rest: first.rest };
}
