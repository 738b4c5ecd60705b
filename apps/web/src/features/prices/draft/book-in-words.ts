import type { Menu } from '#shared/contracts/menu.ts';
import type { PriceBookContent, PricesView } from '#shared/contracts/prices.ts';
import { formatLength } from '#shared/kitchen/measures.ts';
import { formatMoney } from '#shared/kitchen/money.ts';

export type PriceChange = {
  readonly name: string;
  /** As it is written; null where there is none. */
  readonly before: string | null;
  readonly after: string | null;
};

const finishNames = { smooth: 'Smooth finish', textured: 'Textured finish', piped: 'Piped finish' };

/** What two books say differently, in the order of the page. */
export function changesBetween(
  before: PriceBookContent,
  after: PriceBookContent,
  prices: PricesView,
  menu: Menu,
): PriceChange[] {
  const was = bookInWords(before, prices, menu);
  const is = bookInWords(after, prices, menu);
  return [...new Set([...is.keys(), ...was.keys()])]
    .map((name) => ({ name, before: was.get(name) ?? null, after: is.get(name) ?? null }))
    .filter((it) => it.before !== it.after);
}

/** Every price of a book, by a name of its own. */
function bookInWords(
  content: PriceBookContent,
  prices: PricesView,
  { studio }: Menu,
): Map<string, string> {
  const money = (minor: number) => formatMoney(minor, content.currency, studio.locale);
  const share = (ppm: number) => `${ppm / 10_000} %`;
  const length = (mm: number) => formatLength(mm, studio.lengthLead);
  const byId = (
    things: readonly { readonly id: string; readonly name: string }[],
    amounts: Readonly<Record<string, number>>,
    kind: string,
  ): [string, string][] =>
    things.flatMap(({ id, name }) => {
      const minor = amounts[id];
      return minor === undefined || minor === 0 ? [] : [[`${name}, ${kind}`, money(minor)]];
    });
  return new Map([
    ...content.tierBands.map((it): [string, string] => [
      `Tiers up to ${length(it.upToMm)}, a portion`,
      money(it.perPortionMinor),
    ]),
    ['Sheets and cutting cakes, a portion', money(content.sheetPerPortionMinor)],
    ['A dummy tier', money(content.dummyTierMinor)],
    ['Words', money(content.wordsMinor)],
    ...content.finishes.map((it): [string, string] => [
      `${finishNames[it.id]}, a portion`,
      money(it.perPortionMinor),
    ]),
    ...byId(prices.sponges, content.spongeSurcharges, 'sponge'),
    ...byId(prices.fillings, content.fillingSurcharges, 'filling'),
    ...byId(prices.styles, content.styleSurcharges, 'buttercream'),
    ...byId(prices.coverings, content.coveringSurcharges, 'covering'),
    ['An hour of decorating', money(content.decoratingPerHourMinor)],
    ['On top of materials', share(content.materialsMarkupPpm)],
    ...byId(prices.decorations, content.decorationPrices, 'fixed price'),
    ...byId(prices.extras, content.extraPrices, 'extra'),
    ...content.rush.map((it): [string, string] => [
      `Short notice under ${it.underDays} days`,
      share(it.addPpm),
    ]),
    ['The smallest order', money(content.minimumMinor)],
    ['Rounding to', money(content.roundToMinor)],
    ['Deposit', share(content.depositPpm)],
    ['Deposit, at least', money(content.depositFloorMinor)],
    ['Balance due before pickup', `${content.balanceDueDays} days`],
    ['Currency', content.currency],
    ['Tax', content.taxInclusive ? 'in the prices' : 'on top'],
    ...content.taxes.map((it): [string, string] => [
      `${it.name}, on ${it.category}`,
      share(it.ratePpm),
    ]),
    ['An hour at the bench costs', money(content.labourPerHourMinor)],
    ['Overhead', share(content.overheadPpm)],
    ['Margin to aim for', share(content.targetMarginPpm)],
    ...content.packaging.flatMap((it): [string, string][] => [
      [`Box up to ${length(it.upToMm)}`, money(it.boxMinor)],
      [`Board up to ${length(it.upToMm)}`, money(it.boardMinor)],
    ]),
  ]);
}
