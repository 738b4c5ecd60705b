import { colourPicks } from '#shared/kitchen/colour.ts';

export type ColourGroup = { readonly label: string; readonly colours: readonly string[] };

/** Colours to choose from: what is chosen for the cake already, the photos', then our picks. */
export function colourGroups(
  palette: readonly string[],
  fromPhotos: readonly string[],
  chosen: string | null,
): ColourGroup[] {
  const seen = new Set<string>();
  const fresh = (colours: readonly string[]) =>
    colours.filter((it) => {
      const first = !seen.has(it);
      seen.add(it);
      return first;
    });
  const own = fresh([...palette, ...(chosen === null ? [] : [chosen])]);
  return [
    { label: 'Chosen for this cake', colours: own },
    { label: 'From your photos', colours: fresh(fromPhotos) },
    { label: 'Our picks', colours: fresh(colourPicks.map((it) => it.colour)) },
  ].filter((it) => it.colours.length > 0);
}
