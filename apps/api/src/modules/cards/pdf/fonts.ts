import { readFileSync } from 'node:fs';

/** Points a millimetre: a point is 1/72 in. */
export const ptPerMm = 72 / 25.4;

export type FontName = 'text' | 'strong' | 'display';

export type CardFont = {
  readonly bytes: Buffer;
  /** Height of a small x, and of a capital, as parts of the type size; from the font itself. */
  readonly xHeight: number;
  readonly capHeight: number;
};

const files: Readonly<Record<FontName, string>> = {
  text: 'instrument-sans-400.ttf',
  strong: 'instrument-sans-700.ttf',
  display: 'bricolage-grotesque-700.ttf',
};

let loaded: Readonly<Record<FontName, CardFont>> | null = null;

/** The faces cards are set in, read once. They lie beside this file, and beside the built server. */
export function cardFonts(): Readonly<Record<FontName, CardFont>> {
  loaded ??= { text: load('text'), strong: load('strong'), display: load('display') };
  return loaded;
}

function load(name: FontName): CardFont {
  const bytes = readFileSync(new URL(`./fonts/${files[name]}`, import.meta.url));
  return { bytes, ...measuresOf(bytes) };
}

/**
 * Reads `sxHeight`, `sCapHeight` and `unitsPerEm` out of a font's own tables (OpenType 1.9: table
 * directory, `head`, `OS/2` version 2 on).
 */
export function measuresOf(font: Buffer): { xHeight: number; capHeight: number } {
  const unitsPerEm = font.readUInt16BE(tableAt(font, 'head') + 18);
  const os2 = tableAt(font, 'OS/2');
  return {
    xHeight: font.readInt16BE(os2 + 86) / unitsPerEm,
    capHeight: font.readInt16BE(os2 + 88) / unitsPerEm,
  };
}

function tableAt(font: Buffer, tag: string): number {
  const count = font.readUInt16BE(4);
  for (let at = 0; at < count; at += 1) {
    const record = 12 + at * 16;
    if (font.toString('latin1', record, record + 4) === tag) return font.readUInt32BE(record + 8);
  }
  throw new Error(`The font has no table ${tag}.`);
}

const fractions: Readonly<Record<string, string>> = { '¼': '1/4', '½': '1/2', '¾': '3/4' };

/**
 * Text as the fonts can set it: fractions in figures, letters they lack without their marks, and a
 * question mark for what is no Latin letter at all, so that nothing disappears unseen.
 */
export function printable(text: string): string {
  return text
    .replace(/(\d?)([¼½¾])/gu, (_, digit: string, glyph: string) =>
      digit === '' ? (fractions[glyph] ?? glyph) : `${digit} ${fractions[glyph] ?? glyph}`,
    )
    .replace(/[\p{Zs}\p{Cc}]+/gu, ' ')
    .replace(/[^\u0020-\u017e\u2010-\u2026\u20ac]/gu, (letter) => {
      const bare = letter.normalize('NFKD').replace(/\p{M}/gu, '');
      return bare !== '' && /^[\u0020-\u017e]+$/u.test(bare) ? bare : '?';
    });
}

/** Type size in points at which small letters are so high. */
export function sizeForXHeight(xHeightMm: number, font: FontName = 'text'): number {
  return (xHeightMm * ptPerMm) / cardFonts()[font].xHeight;
}

/** Type size in points at which figures are at least so high; they are as high as capitals. */
export function sizeForFigures(figureMm: number, font: FontName = 'display'): number {
  return (figureMm * ptPerMm) / cardFonts()[font].capHeight;
}
