type Rgb = readonly [number, number, number];

/**
 * So many colours that stand for a picture, the most frequent first: the box of colours that is
 * widest for its share is halved until there are enough (median cut).
 * @param pixels red, green and blue in turn, a byte each
 */
export function paletteOf(pixels: Uint8Array, count: number): string[] {
  const colours: Rgb[] = [];
  for (let at = 0; at + 2 < pixels.length; at += 3) {
    colours.push([pixels[at] ?? 0, pixels[at + 1] ?? 0, pixels[at + 2] ?? 0]);
  }
  const boxes = [colours];
  while (boxes.length < count) {
    const widest = boxes.toSorted((a, b) => weightOf(b) - weightOf(a))[0];
    if (widest === undefined || weightOf(widest) === 0) break;
    boxes.splice(boxes.indexOf(widest), 1, ...halve(widest));
  }
  return boxes
    .filter((box) => box.length > 0)
    .toSorted((a, b) => b.length - a.length)
    .map(hexOf);
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

function hexOf(box: readonly Rgb[]): string {
  const sums = box.reduce<[number, number, number]>(
    (sum, colour) => [sum[0] + colour[0], sum[1] + colour[1], sum[2] + colour[2]],
    [0, 0, 0],
  );
  const hex = sums.map((sum) =>
    Math.round(sum / box.length)
      .toString(16)
      .padStart(2, '0'),
  );
  return `#${hex.join('')}`;
}
