import type { Box, ColdPlace } from './model.ts';

const holds = (place: ColdPlace, box: Box): boolean =>
  place.heightMm >= box.heightMm &&
  ((place.widthMm >= box.widthMm && place.depthMm >= box.depthMm) ||
    (place.widthMm >= box.depthMm && place.depthMm >= box.widthMm));

/** Whether a box could stand anywhere in the fridge at all. */
export function fitsSomewhere(cold: readonly ColdPlace[], box: Box): boolean {
  return cold.some((place) => place.places > 0 && holds(place, box));
}

/**
 * Whether all boxes can stand in the cold at once, each in a place of its own. Exact: boxes are
 * matched to places by augmenting paths, so a small cake moves over where a large one needs to.
 */
export function fitsTheCold(cold: readonly ColdPlace[], boxes: readonly Box[]): boolean {
  const inPlace: Box[][] = cold.map(() => []);
  const place = (box: Box, seen: Set<number>): boolean => {
    for (const [n, kind] of cold.entries()) {
      if (seen.has(n) || !holds(kind, box)) continue;
      seen.add(n);
      const there = inPlace[n] ?? [];
      if (there.length < kind.places) {
        there.push(box);
        return true;
      }
      for (const [at, other] of there.entries()) {
        if (place(other, seen)) {
          there[at] = box;
          return true;
        }
      }
    }
    return false;
  };
  return boxes.every((box) => place(box, new Set()));
}
