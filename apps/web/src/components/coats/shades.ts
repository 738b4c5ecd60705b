/**
 * Colours that follow from a food's own colour. Tokens colour the page; what is drawn of a cake
 * wears the cake's colours and shades of them.
 */

/** The line around something of that colour. */
export function outlineOf(colour: string): string {
  return `color-mix(in oklab, ${colour} 52%, var(--color-ink))`;
}

/** A fine line upon that colour: a comb's stroke, a layer shining through. */
export function lineOn(colour: string): string {
  return `color-mix(in oklab, ${colour} 82%, var(--color-ink))`;
}

/** A little deeper than that colour: the side that lies away. */
export function deeper(colour: string): string {
  return `color-mix(in oklab, ${colour} 92%, var(--color-ink))`;
}

/** Ink on light colours, enamel on dark ones (relative luminance by WCAG 2.2). */
export function readableOn(colour: string): string {
  return luminance(colour) > 0.32 ? 'var(--color-ink)' : 'var(--color-enamel)';
}

function luminance(colour: string): number {
  const [red = 1, green = 1, blue = 1] = [1, 3, 5].map((at) => {
    const part = Number.parseInt(colour.slice(at, at + 2), 16) / 255;
    return part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}
