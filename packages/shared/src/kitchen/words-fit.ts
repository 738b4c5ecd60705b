import type { Menu } from '#shared/contracts/menu.ts';

/** Characters that can be piped on a tier of this width, in two lines. */
export function wordsFit(widthMm: number, menu: Menu): number {
  return Math.floor((widthMm * menu.wordsPer100Mm) / 100);
}

let segmenter: Intl.Segmenter | null = null;

/** Characters as people count them: a letter with its accents, or an emoji, is one. */
export function countCharacters(text: string): number {
  // Plain text needs no segmenter, and nearly all words on cakes are plain.
  if (/^[\u0020-\u007e]*$/u.test(text)) return text.length;
  segmenter ??= new Intl.Segmenter();
  return [...segmenter.segment(text)].length;
}
