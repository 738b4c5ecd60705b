/** The house's colours for paper: the same as on the screens. */
export const paper = {
  enamel: '#FFFFFF',
  cloud: '#F2F5F9',
  seam: '#D5DCE8',
  ink: '#14203D',
  slate: '#566179',
  cobalt: '#23429A',
  cobaltTint: '#E7ECF8',
  butter: '#F2B632',
  butterTint: '#FFF5D3',
  leaf: '#2C7A4B',
  berry: '#B3263E',
  berryTint: '#FBE6E9',
} as const;

/** A colour with so much of another in it, straight in sRGB: enough for an outline. */
export function mixed(colour: string, other: string, share: number): string {
  const parts = [1, 3, 5].map((at) => {
    const own = Number.parseInt(colour.slice(at, at + 2), 16);
    const added = Number.parseInt(other.slice(at, at + 2), 16);
    return Math.round(own * (1 - share) + added * share)
      .toString(16)
      .padStart(2, '0');
  });
  return `#${parts.join('')}`;
}

/** The line around something of that colour. */
export const outlineOf = (colour: string): string => mixed(colour, paper.ink, 0.48);

/** A fine line upon that colour. */
export const lineOn = (colour: string): string => mixed(colour, paper.ink, 0.2);
