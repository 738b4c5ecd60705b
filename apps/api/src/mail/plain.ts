/** Text that came from a person, made fit for a mail. */

/** Marks that turn the direction of what follows them (Unicode Standard Annex 9). */
const directing = /[\u202a-\u202e\u2066-\u2069]/g;
const rightToLeft = /[\p{sc=Hebrew}\p{sc=Arabic}\p{sc=Syriac}\p{sc=Thaana}\p{sc=Nko}]/u;

/**
 * Text on one line, so that in a header it can begin no header of its own, and with no marks that
 * would turn the words around it.
 */
export function oneLine(text: string): string {
  return text
    .replaceAll(directing, '')
    .replaceAll(/\p{Cc}+/gu, ' ')
    .replaceAll(/ {2,}/g, ' ')
    .trim();
}

/** A name among other words; one written from right to left is kept to itself. */
export function nameInText(name: string): string {
  const line = oneLine(name);
  return rightToLeft.test(line) ? `\u2068${line}\u2069` : line;
}

/** What a person wrote: line breaks kept, and nothing else that is not text. */
export function proseOf(text: string): string {
  return text
    .replaceAll(/\r\n?/g, '\n')
    .replaceAll(directing, '')
    .replaceAll(/[^\P{Cc}\n\t]+/gu, '')
    .trim();
}

/** Breaks text into lines of at most `width` characters, at spaces; a longer word stays whole. */
export function wrap(text: string, width = 72): string[] {
  return text.split('\n').flatMap((line) => {
    const lines: string[] = [];
    let current = '';
    for (const word of line.split(' ')) {
      const longer = current === '' ? word : `${current} ${word}`;
      if (longer.length <= width || current === '') current = longer;
      else {
        lines.push(current);
        current = word;
      }
    }
    return [...lines, current];
  });
}
