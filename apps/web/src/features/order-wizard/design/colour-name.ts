import { colourPicks } from '#shared/kitchen/colour.ts';

/** A colour's name where it is one of ours, else its figures. */
export function colourName(colour: string): string {
  return colourPicks.find((it) => it.colour === colour)?.name ?? colour;
}

/** "Photo color 2": a colour out of the customer's pictures, by its place among them; null for others. */
export function photoColour(colour: string, fromPhotos: readonly string[]): string | null {
  const at = fromPhotos.indexOf(colour);
  return at < 0 ? null : `Photo color ${at + 1}`;
}
