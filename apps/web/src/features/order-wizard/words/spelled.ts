/** One written sign, as it will be piped, and how to say it. */
export type SpelledSign = { readonly sign: string; readonly said: string };

const names: Readonly<Record<string, string>> = {
  ' ': 'space',
  '.': 'full stop',
  ',': 'comma',
  '!': 'exclamation mark',
  '?': 'question mark',
  '&': 'and sign',
  "'": 'apostrophe',
  '’': 'apostrophe',
  '-': 'hyphen',
  '+': 'plus sign',
  '"': 'quotation mark',
};

const segmenter = new Intl.Segmenter(undefined, { granularity: 'grapheme' });

/** The signs of a text as people count them: an emoji or an accented letter is one. */
function signsOf(text: string): string[] {
  return [...segmenter.segment(text)].map((part) => part.segment);
}

/** Spells words back, sign by sign, the way one would over the telephone. */
export function spellBack(text: string): SpelledSign[] {
  return signsOf(text.trim()).map((sign) => {
    const name = names[sign];
    if (name !== undefined) return { sign, said: name };
    const capital = sign.toLowerCase() !== sign && sign.toUpperCase() === sign;
    return { sign, said: capital ? `capital ${sign}` : sign };
  });
}

/** The signs word by word, each word ending with the space after it, so that none is torn apart. */
export function spelledWords(signs: readonly SpelledSign[]): SpelledSign[][] {
  const words: SpelledSign[][] = [[]];
  for (const sign of signs) {
    words.at(-1)?.push(sign);
    if (sign.sign === ' ') words.push([]);
  }
  return words.filter((word) => word.length > 0);
}
