import {
  differenceCiede2000,
  formatHex,
  modeLab65,
  modeLrgb,
  modeRgb,
  parseHex,
  useMode,
  type Color,
} from 'culori/fn';
import type { KitchenRules } from '#shared/contracts/kitchen-rules.ts';

useMode(modeRgb);
useMode(modeLab65);
const toLinear = useMode(modeLrgb);

/** CIEDE2000 with its standard weights, in CIELAB under D65. */
const difference = differenceCiede2000();

/**
 * Under which difference a colour comes `close` (3: the eye takes it for the wanted one), and under
 * which it `shifts` (10: the same name still).
 */
type ReachRule = Pick<KitchenRules, 'closeBelow' | 'shiftsBelow'>;

export type Reach = 'close' | 'shifts' | 'not-on-this-base';

export type ReachedTint = {
  readonly wanted: string;
  /** The nearest the base comes, `#rrggbb`. */
  readonly reached: string;
  /** CIEDE2000 between the two. */
  readonly difference: number;
  readonly reach: Reach;
};

/** CIEDE2000 difference of two colours; 0 is the same. Throws on what is not a `#rrggbb`. */
export function colourDifference(a: Color | string, b: Color | string): number {
  return difference(
    typeof a === 'string' ? colourOf(a) : a,
    typeof b === 'string' ? colourOf(b) : b,
  );
}

function colourOf(hex: string): Color {
  const colour = parseHex(hex);
  if (colour === undefined) throw new RangeError(`Not a colour: ${hex}`);
  return colour;
}

/**
 * What dye makes of a base. Dye only takes light away: of the red, green and blue light a base
 * gives back, each can be lowered to what the wanted colour gives and none can be raised. So
 * deep colours come on any base, a clean pale blue comes on none that is bright yellow (it comes
 * out green, as dyed yolk does), and nothing comes whiter than the base is. Of real dyes, which
 * take a little of every light, this is the best that can be hoped for.
 */
export function reachableTint(
  wanted: string,
  base: string,
  { closeBelow, shiftsBelow }: ReachRule,
): ReachedTint {
  const aim = toLinear(colourOf(wanted));
  const start = toLinear(colourOf(base));
  const reached = formatHex({
    mode: 'lrgb',
    r: Math.min(aim.r, start.r),
    g: Math.min(aim.g, start.g),
    b: Math.min(aim.b, start.b),
  });
  const off = colourDifference(wanted, reached);
  return {
    wanted,
    reached,
    difference: off,
    reach: off < closeBelow ? 'close' : off < shiftsBelow ? 'shifts' : 'not-on-this-base',
  };
}

/** Colours offered as a start; names and mixes are our own. */
export const colourPicks = [
  { name: 'Chalk', colour: '#f4f1ea' },
  { name: 'Oat', colour: '#e8dcc4' },
  { name: 'Shell pink', colour: '#f5d3cf' },
  { name: 'Rose hip', colour: '#d9767c' },
  { name: 'Apricot', colour: '#f3b183' },
  { name: 'Marigold', colour: '#eeb03a' },
  { name: 'Lemon peel', colour: '#f3dd7a' },
  { name: 'Pistachio', colour: '#c4d3a0' },
  { name: 'Sage', colour: '#9cab8b' },
  { name: 'Fir', colour: '#3f5b47' },
  { name: 'Morning sky', colour: '#bcd7ea' },
  { name: 'Cornflower', colour: '#7f9fd6' },
  { name: 'Ink blue', colour: '#2d4372' },
  { name: 'Lilac', colour: '#cdb9dd' },
  { name: 'Plum', colour: '#6f3f63' },
  { name: 'Cocoa', colour: '#6b4a38' },
] as const;
