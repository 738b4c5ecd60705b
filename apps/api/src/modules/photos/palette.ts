type Rgb = readonly [number, number, number];

/** Closer than this, of 441 from black to white, two colours look like one on a chip. */
const tellApart = 32;

/**
 * At most so many colours that stand for a picture and can be told apart, the most frequent first: the box of colours that is
 * widest for its share is halved until there are enough (median cut).
 * @param pixels red, green and blue in turn, a byte each
 */
export function paletteOf(pixels: Uint8Array, count: number): string[] {
  const colours: Rgb[] = [];
  for (let at = 0; at + 2 < pixels.length; at += 3) {
    colours.push([pixels[at] ?? 0, pixels[at + 1] ?? 0, pixels[at + 2] ?? 0]);
  }
  const boxes = [colours];
  // Twice as many as wanted: some stand for one flat colour and the noise around it.
  while (boxes.length < count * 2) {
    const widest = boxes.toSorted((a, b) => weightOf(b) - weightOf(a))[0];
    if (widest === undefined || weightOf(widest) === 0) break;
    boxes.splice(boxes.indexOf(widest), 1, ...halve(widest));
  }
  return boxes
    .filter((box) => box.length > 0)
    .toSorted((a, b) => b.length - a.length)
    .map(meanOf)
    .reduce<Rgb[]>(
      (kept, it) => (kept.some((known) => distance(known, it) < tellApart) ? kept : [...kept, it]),
      [],
    )
    .slice(0, count)
    .map(hexOf);
}

function distance(a: Rgb, b: Rgb): number {
  return Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]);
}

/** Spread along the widest channel, times the root of how many pixels it stands for. */
function weightOf(box: readonly Rgb[]): number {
  return rangeOf(box, widestChannel(box)) * Math.sqrt(box.length);
}

function halve(box: readonly Rgb[]): [Rgb[], Rgb[]] {
  const channel = widestChannel(box);
  const sorted = box.toSorted((a, b) => a[channel] - b[channel]);
  // At the widest step between neighbours near the middle, so that flat colours stay whole.
  let cut = Math.floor(sorted.length / 2);
  let step = -1;
  for (let at = 1; at < sorted.length; at += 1) {
    const jump = (sorted[at]?.[channel] ?? 0) - (sorted[at - 1]?.[channel] ?? 0);
    if (jump > step) [cut, step] = [at, jump];
  }
  const clear = step >= rangeOf(box, channel) / 4;
  const at = clear ? cut : Math.floor(sorted.length / 2);
  return [sorted.slice(0, at), sorted.slice(at)];
}

function widestChannel(box: readonly Rgb[]): 0 | 1 | 2 {
  const ranges = ([0, 1, 2] as const).map((channel) => ({ channel, range: rangeOf(box, channel) }));
  return ranges.toSorted((a, b) => b.range - a.range)[0]?.channel ?? 0;
}

function rangeOf(box: readonly Rgb[], channel: 0 | 1 | 2): number {
  let low = 255;
  let high = 0;
  for (const colour of box) {
    low = Math.min(low, colour[channel]);
    high = Math.max(high, colour[channel]);
  }
  return Math.max(0, high - low);
}

function meanOf(box: readonly Rgb[]): Rgb {
  const sums = box.reduce<Rgb>(
    (sum, colour) => [sum[0] + colour[0], sum[1] + colour[1], sum[2] + colour[2]],
    [0, 0, 0],
  );
  return [sums[0] / box.length, sums[1] / box.length, sums[2] / box.length];
}

function hexOf(colour: Rgb): string {
  return `#${colour.map((it) => Math.round(it).toString(16).padStart(2, '0')).join('')}`;
}
