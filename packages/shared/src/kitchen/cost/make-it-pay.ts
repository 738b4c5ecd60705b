import type { Price } from '#shared/contracts/estimates.ts';
import type { PriceBook } from '#shared/contracts/menu.ts';
import { formatDuration } from '#shared/dates/format.ts';
import { formatMoney } from '../money.ts';
import { roundToStep, shareOf } from '../shares.ts';
import type { CostRates, CostLine, DesignCost } from './cost-design.ts';

export type Lever = {
  readonly kind: 'price' | 'portion' | 'size' | 'minutes' | 'ingredients' | 'rush' | 'discount';
  readonly title: string;
  readonly sentence: string;
  /** Whether this alone reaches the margin aimed for. */
  readonly enough: boolean;
};

/** The same cake with one tier a size up or down: what that costs and leaves. */
export type OtherSize = {
  readonly label: string;
  readonly netPriceMinor: number;
  readonly totalCostMinor: number;
};

export type PayInput = {
  readonly cost: DesignCost;
  readonly rates: Pick<CostRates, 'labourPerHourMinor' | 'overheadPpm'>;
  readonly price: Price;
  readonly book: Pick<PriceBook, 'taxes' | 'roundToMinor' | 'rush'>;
  /** Portions that are charged for. */
  readonly portions: number;
  readonly sizes: readonly OtherSize[];
  readonly locale: string;
};

const whole = 1_000_000;

/**
 * What would bring an order to the margin aimed for, each lever alone and with its amount; empty
 * where it pays already or nothing could (a margin of the whole price).
 */
export function makeItPay(input: PayInput): Lever[] {
  const { cost } = input;
  if (paysEnough(cost) || cost.targetMarginPpm >= whole) return [];
  return [
    priceLever(input),
    portionLever(input),
    sizeLever(input),
    minutesLever(input),
    ingredientLever(input),
    rushLever(input),
    discountLever(input),
  ].filter((it) => it !== null);
}

/** Whether the known cost leaves the margin aimed for. */
export function paysEnough(cost: DesignCost): boolean {
  return (
    cost.marginPpm !== null && cost.marginMinor * whole >= cost.netPriceMinor * cost.targetMarginPpm
  );
}

/** The least net price that leaves the target: cost / (1 - target), whole minor units upwards. */
export function netPriceFor(totalMinor: number, targetMarginPpm: number): number {
  const divisor = BigInt(whole - targetMarginPpm);
  return Number((BigInt(totalMinor) * BigInt(whole) + divisor - 1n) / divisor);
}

/** The dearest the cake may be to make at its present price. */
function costFor(cost: DesignCost): number {
  return Number(
    (BigInt(Math.max(0, cost.netPriceMinor)) * BigInt(whole - cost.targetMarginPpm)) /
      BigInt(whole),
  );
}

const moreNet = ({ cost }: PayInput) =>
  netPriceFor(cost.totalMinor, cost.targetMarginPpm) - cost.netPriceMinor;

function priceLever(input: PayInput): Lever {
  const { cost, price, book } = input;
  const more = moreNet(input);
  // Tax goes on top of what is added, by the rate of the first category, which is cake's.
  const tax = shareOf(more, book.taxes[0]?.ratePpm ?? 0, cost.currency);
  const exact = price.totalMinor + more + tax;
  const step = Math.max(1, book.roundToMinor);
  const nearest = roundToStep(exact, step);
  const total = nearest < exact ? nearest + step : nearest;
  const money = moneyOf(input);
  return {
    kind: 'price',
    title: 'Charge more',
    sentence: `At ${money(total)} instead of ${money(price.totalMinor)} it leaves ${percent(cost.targetMarginPpm)}.`,
    enough: true,
  };
}

function portionLever(input: PayInput): Lever | null {
  const { portions } = input;
  if (portions <= 0) return null;
  const each = Math.ceil(moreNet(input) / portions);
  return {
    kind: 'portion',
    title: 'Raise the price of a portion',
    sentence: `${moneyOf(input)(each)} more on each of its ${portions} portions, before tax.`,
    enough: true,
  };
}

/** The one size up or down that leaves the largest share, where it leaves more than now. */
function sizeLever(input: PayInput): Lever | null {
  const { cost, sizes } = input;
  const money = moneyOf(input);
  const best = sizes
    .filter((it) => it.netPriceMinor > 0)
    .map((it) => ({ ...it, marginPpm: marginPpm(it.netPriceMinor, it.totalCostMinor) }))
    .toSorted((a, b) => b.marginPpm - a.marginPpm)[0];
  if (best === undefined || best.marginPpm <= (cost.marginPpm ?? -whole)) return null;
  const price = best.netPriceMinor - cost.netPriceMinor;
  const making = best.totalCostMinor - cost.totalMinor;
  return {
    kind: 'size',
    title: 'Another size',
    sentence: `${best.label}: ${change(price, money)} in price and ${change(making, money)} in cost. It leaves ${percent(best.marginPpm)}.`,
    enough: best.marginPpm >= cost.targetMarginPpm,
  };
}

function minutesLever(input: PayInput): Lever | null {
  const { cost, rates } = input;
  const perMinute = (rates.labourPerHourMinor / 60) * (1 + rates.overheadPpm / whole);
  if (perMinute <= 0 || cost.minutes <= 0) return null;
  const less = cost.totalMinor - costFor(cost);
  const minutes = Math.ceil(less / perMinute);
  const longest = lineOf(cost, 'labour')?.items.toSorted(
    (a, b) => (b.minutes ?? 0) - (a.minutes ?? 0),
  )[0];
  const most =
    longest === undefined
      ? ''
      : ` ${longest.label} takes the most, ${formatDuration(longest.minutes ?? 0)}.`;
  const enough = minutes <= cost.minutes;
  return {
    kind: 'minutes',
    title: 'Save time',
    sentence: enough
      ? `${formatDuration(minutes)} less of its ${formatDuration(cost.minutes)} of work.${most}`
      : `Even all its ${formatDuration(cost.minutes)} of work would not be enough.${most}`,
    enough,
  };
}

/** What buying better may save of what ingredients cost, without another cake (memory). */
const mostSaved = 0.25;

function ingredientLever(input: PayInput): Lever | null {
  const { cost, rates } = input;
  const lines = [lineOf(cost, 'ingredients'), lineOf(cost, 'eggs')].filter(
    (it) => it !== undefined,
  );
  const spent = lines.reduce((sum, it) => sum + it.amountMinor, 0);
  if (spent <= 0) return null;
  const money = moneyOf(input);
  const less = Math.ceil((cost.totalMinor - costFor(cost)) / (1 + rates.overheadPpm / whole));
  const dearest = lines
    .flatMap((it) => it.items)
    .filter((it) => it.amountMinor !== null)
    .toSorted((a, b) => (b.amountMinor ?? 0) - (a.amountMinor ?? 0))
    .slice(0, 3)
    .map((it) => `${it.label} ${money(it.amountMinor ?? 0)}`)
    .join(', ');
  const enough = less <= spent * mostSaved;
  const share =
    cost.netPriceMinor > 0
      ? ` (${percent((spent / cost.netPriceMinor) * whole)} of the net price)`
      : '';
  const they = `the ${money(spent)}${share} they cost`;
  const sentence = enough
    ? `${money(less)} less of ${they}.`
    : less <= spent
      ? `It would take ${money(less)} less of ${they}: more than buying better saves.`
      : `Even all of ${they} would not be enough.`;
  return {
    kind: 'ingredients',
    title: 'Spend less on ingredients',
    sentence: `${sentence} Dearest: ${dearest}.`,
    enough,
  };
}

/** What short notice brings in, or would. */
function rushLever(input: PayInput): Lever | null {
  const { cost, price, book } = input;
  const money = moneyOf(input);
  const line = price.lines.find((it) => it.kind === 'rush');
  if (line !== undefined) {
    const without = marginPpm(cost.netPriceMinor - line.amountMinor, cost.totalMinor);
    return {
      kind: 'rush',
      title: 'Short notice',
      sentence: `It already brings ${money(line.amountMinor)}; without it ${percent(without)} would be left.`,
      enough: false,
    };
  }
  const band = book.rush.toSorted((a, b) => b.underDays - a.underDays)[0];
  if (band === undefined || cost.netPriceMinor <= 0) return null;
  const more = shareOf(cost.netPriceMinor, band.addPpm, cost.currency);
  const left = marginPpm(cost.netPriceMinor + more, cost.totalMinor);
  return {
    kind: 'rush',
    title: 'Short notice',
    sentence: `Asked for under ${band.underDays} days ahead, it would bring about ${money(more)} more and leave ${percent(left)}.`,
    enough: left >= cost.targetMarginPpm,
  };
}

function discountLever(input: PayInput): Lever | null {
  const { cost, price } = input;
  const given = -price.lines
    .filter((it) => it.kind === 'discount')
    .reduce((sum, it) => sum + it.amountMinor, 0);
  if (given <= 0) return null;
  const left = marginPpm(cost.netPriceMinor + given, cost.totalMinor);
  return {
    kind: 'discount',
    title: 'Leave out the discount',
    sentence: `Without the ${moneyOf(input)(given)} taken off, ${percent(left)} would be left.`,
    enough: left >= cost.targetMarginPpm,
  };
}

function lineOf(cost: DesignCost, kind: CostLine['kind']): CostLine | undefined {
  return cost.lines.find((it) => it.kind === kind);
}

function marginPpm(netMinor: number, costMinor: number): number {
  return netMinor <= 0 ? -whole : Math.round(((netMinor - costMinor) / netMinor) * whole);
}

const moneyOf =
  ({ cost, locale }: PayInput) =>
  (amountMinor: number): string =>
    formatMoney(amountMinor, cost.currency, locale);

/** "12.5 %", to a tenth. */
function percent(ppm: number): string {
  return `${String(Math.round(ppm / 1000) / 10)} %`;
}

function change(amountMinor: number, money: (amountMinor: number) => string): string {
  return amountMinor < 0 ? `${money(-amountMinor)} less` : `${money(amountMinor)} more`;
}
