import { colourPicks } from '#shared/kitchen/colour.ts';

/** A colour's name where it is one of ours, else its figures. */
export function colourName(colour: string): string {
  return colourPicks.find((it) => it.colour === colour)?.name ?? colour;
}
