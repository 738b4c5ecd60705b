import { readFigure, type Figure } from './figures.ts';
import type { AmountPart, ReadAmount } from './typed-line.ts';
import { gramsPerUnit, readUnit } from './units-typed.ts';

/** A line's amounts, and its text with a mark where each of them stood. */
export type ReadAmounts = { readonly amounts: readonly ReadAmount[]; readonly rest: string };

/** Stands in `rest` for an amount; people cannot type it on a line. */
export const amountMark = '\u0000';
/** Stands in a line for a part's whole name. */
export const nameMark = '\u0001';

type Found<T> = { readonly value: T; readonly rest: string };

/** `1 14-oz can`, `2 (14 oz) cans`, `1 x 400 g tin`: what holds it may be any such pack. */
const pack =
  /^\s*\)?\s*-?\s*(?:cans?|tins?|jars?|packages?|pkgs?|packets?|blocks?|bags?|boxes|cartons?)\b\.?/iu;
const times = /^\s*[x×*]\s*/iu;
const handful =
  /^\s*(?:(?:very|firmly|lightly|well)\s+)?(level|heaping|heaped|rounded|scant|generous|packed|sifted|unsifted)\s+/iu;
const eggSize = /^\s*(extra[- ]large|x-large|xl|large|medium|small|jumbo)\b/iu;
const sum = /^\s*(?:\+|&|plus\b|and\b)\s*/iu;
const through = /^\s*(?:-|–|—|to\b|or\b)\s*/iu;
const beforeWords = new RegExp(`^\\s+[\\p{L}${nameMark}]`, 'u');
const loneMeasure = /^(?:pinch|dash)\b/iu;

const partOf = (
  figure: Figure,
  unit: AmountPart['unit'],
  scale: number,
  qualifier: string | null,
  statedG: number | null = null,
): AmountPart => ({
  unit,
  least: figure.least * scale,
  most: figure.most * scale,
  count: ((figure.least + figure.most) / 2) * scale,
  qualifier,
  statedG,
});

/** `14-oz` or `(400 g)` before a can: grams of one, and what follows the can. */
function readPack(text: string): Found<number> | null {
  const start = text.replace(times, '').replace(/^\s*\(?\s*/u, '');
  const size = readFigure(start);
  const unit = size === null ? null : readUnit(size.rest);
  const grams = unit === null ? undefined : gramsPerUnit[unit.unit];
  if (size === null || unit === null || grams === undefined) return null;
  const can = pack.exec(unit.rest);
  if (can === null) return null;
  return { value: size.least * grams, rest: unit.rest.slice(can[0].length) };
}

/** One measure with its figure; a bare figure counts pieces where `bare` allows it. */
function readPart(text: string, bare: boolean): Found<AmountPart> | null {
  const figure = readFigure(text);
  if (figure === null) {
    const lone = loneMeasure.test(text) ? readUnit(text) : null;
    const one = { least: 1, most: 1, rest: '' };
    return lone && { value: partOf(one, lone.unit, lone.times, null), rest: lone.rest };
  }
  const counted = readPack(figure.rest);
  if (counted !== null) {
    return { value: partOf(figure, 'can', 1, null, counted.value), rest: counted.rest };
  }
  const adjective = handful.exec(figure.rest);
  const afterAdjective = adjective === null ? figure.rest : figure.rest.slice(adjective[0].length);
  const unit = readUnit(afterAdjective);
  if (unit !== null) {
    const qualifier = adjective?.[1]?.toLowerCase() ?? null;
    const single = gramsPerUnit[unit.unit];
    const can = single === undefined ? null : pack.exec(unit.rest);
    // `14-oz can` without a count is one can.
    if (can !== null && single !== undefined) {
      const one = { least: 1, most: 1, rest: '' };
      const value = partOf(one, 'can', 1, null, figure.least * single);
      return { value, rest: unit.rest.slice(can[0].length) };
    }
    return { value: partOf(figure, unit.unit, unit.times, qualifier), rest: unit.rest };
  }
  const multiplied = times.exec(figure.rest);
  const each = multiplied && readPart(figure.rest.slice(multiplied[0].length), false);
  if (each !== null && each.value.least === each.value.most) {
    const { unit: unitOfEach, count, statedG } = each.value;
    return { value: partOf(figure, unitOfEach, count, null, statedG), rest: each.rest };
  }
  if (!bare || !beforeWords.test(figure.rest)) return null;
  const size = eggSize.exec(figure.rest);
  const rest = size === null ? figure.rest : figure.rest.slice(size[0].length);
  return { value: partOf(figure, 'piece', 1, classOf(size?.[1])), rest };
}

function classOf(size: string | undefined): string | null {
  if (size === undefined) return null;
  const lower = size.toLowerCase();
  return /^(?:x|extra)/u.test(lower) ? 'extra-large' : lower;
}

/** Parts that add up: `1 cup plus 2 tablespoons`, `1 lb 4 oz`; or `15 mL to 45 mL` as a range. */
function readAmount(text: string, bare: boolean): Found<ReadAmount> | null {
  const first = readPart(text, bare);
  if (first === null) return null;
  const parts = [first.value];
  let { rest } = first;
  const to = through.exec(rest);
  const end = to === null ? null : readPart(rest.slice(to[0].length), false);
  if (end !== null && end.value.unit === first.value.unit && end.value.count > first.value.count) {
    const range = { least: first.value.least, most: end.value.most, rest: '' };
    parts[0] = partOf(range, first.value.unit, 1, first.value.qualifier, first.value.statedG);
    ({ rest } = end);
  }
  for (
    let next = readNext(rest, parts.at(-1));
    next !== null;
    next = readNext(rest, parts.at(-1))
  ) {
    parts.push(next.value);
    ({ rest } = next);
  }
  const typed = text.slice(0, text.length - rest.length).trim();
  return { value: { typed, parts }, rest };
}

function readNext(rest: string, before: AmountPart | undefined): Found<AmountPart> | null {
  const joined = sum.exec(rest);
  if (joined !== null) return readPart(rest.slice(joined[0].length), false);
  if (before?.unit !== 'pound') return null;
  const ounces = readPart(rest.trimStart(), false);
  return ounces?.value.unit === 'ounce' ? ounces : null;
}

/** Where an amount may start: the line's start, or after a blank or a mark of punctuation. */
const boundary = /[\s(,;:/=~≈[\u2013\u2014]/u;

/** Every amount on a line, wherever it stands. */
export function readAmounts(text: string): ReadAmounts {
  const amounts: ReadAmount[] = [];
  let rest = '';
  for (let at = 0; at < text.length;) {
    const start = at === 0 || boundary.test(text.charAt(at - 1));
    const found = start ? readAmount(text.slice(at), at === 0) : null;
    if (found === null) {
      rest += text.charAt(at);
      at += 1;
    } else {
      amounts.push(found.value);
      rest += amountMark;
      at = text.length - found.rest.length;
    }
  }
  return { amounts, rest };
}
