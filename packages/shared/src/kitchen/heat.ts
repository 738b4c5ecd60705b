import type { Setting } from '#shared/contracts/design.ts';
import type { KitchenRules } from '#shared/contracts/kitchen-rules.ts';
import type { ButtercreamStyle, Covering, Menu } from '#shared/contracts/menu.ts';
import type { AdviceLevel } from '#shared/contracts/vocabulary.ts';

/** What the cake will meet, and whether the customer knows it or the studio reckons it. */
export type Warmth = {
  readonly celsius: number;
  readonly known: boolean;
  /** Month the studio's figure is for, 1 to 12; null for the warmest of the year. */
  readonly month: number | null;
};

/** Without a figure of the studio's own for a month. */
const unmeasuredC = 27;

/**
 * The warmest a setting will get. "Don't know" takes the studio's figure for the month of the
 * day, indoors no less than a heated room; while no day is chosen, that of its warmest month.
 */
export function warmthOf(
  setting: Setting,
  { studio, kitchen }: Pick<Menu, 'studio' | 'kitchen'>,
  date: string | null,
): Warmth {
  if (setting.warmestC !== null) return { celsius: setting.warmestC, known: true, month: null };
  const figures = studio.monthlyWarmestC;
  if (date !== null) {
    const month = Number(date.slice(5, 7));
    const outdoors = figures[month - 1] ?? unmeasuredC;
    const celsius = setting.place === 'indoors' ? Math.max(outdoors, kitchen.usualRoomC) : outdoors;
    return { celsius, known: false, month };
  }
  const celsius = figures.length === 0 ? unmeasuredC : Math.max(...figures);
  return { celsius, known: false, month: null };
}

/** How far under a limit counts as `ok`. */
type MarginRule = Pick<KitchenRules, 'heatMarginC'>;

/** `ok` by the studio's margin under the limit (3 °C), `care` up to it, `stop` above. */
export function fareInHeat(
  limitC: number,
  warmestC: number,
  { heatMarginC }: MarginRule,
): AdviceLevel {
  if (warmestC > limitC) return 'stop';
  return warmestC > limitC - heatMarginC ? 'care' : 'ok';
}

/** The warmest a coat holds to, °C: what is outermost decides. */
export function coatLimitC(coat: {
  readonly covering: Covering;
  readonly style: ButtercreamStyle | null;
}): number {
  const { covering, style } = coat;
  return style === null || covering.id === 'fondant' || covering.id === 'ganache'
    ? covering.holdsToC
    : style.holdsToC;
}

/** How a coat fares: heat, direct sun (always a stop), and a figure nobody knows (never `ok`). */
export function fareOfCoat(
  limitC: number,
  setting: Setting,
  warmth: Warmth,
  rules: MarginRule,
): AdviceLevel {
  if (setting.place === 'sun') return 'stop';
  const fare = fareInHeat(limitC, warmth.celsius, rules);
  return fare === 'ok' && !warmth.known ? 'care' : fare;
}

/** "in the sun", "outside", "inside": where the cake stands. */
export const whereWords = { indoors: 'inside', shade: 'outside', sun: 'in the sun' } as const;

const order: Record<AdviceLevel, number> = { ok: 0, care: 1, stop: 2 };

/** Sorts levels from `ok` to `stop`. */
export const byLevel = (a: AdviceLevel, b: AdviceLevel): number => order[a] - order[b];

/** The sharper of two levels. */
export function sharper(a: AdviceLevel, b: AdviceLevel): AdviceLevel {
  return byLevel(a, b) >= 0 ? a : b;
}
