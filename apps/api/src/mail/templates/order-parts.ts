import { formatList } from '#shared/dates/format.ts';
import { formatLength, formatWeight } from '#shared/kitchen/measures.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { button, fact, facts, heading, text } from '../content.ts';
import type { Block, MailBody } from '../content.ts';
import type { House } from '../house.ts';
import type { MailOrder } from '../mail-data.ts';
import { nameInText, oneLine } from '../plain.ts';
import { orderDay, pickupText } from '../when.ts';

/** What every mail about an order has, and the words it can fill in. */
export function orderBody(
  order: MailOrder,
  house: House,
  body: Pick<MailBody, 'title' | 'preview' | 'blocks'>,
): MailBody {
  return {
    ...body,
    fill: {
      name: nameInText(order.name),
      number: String(order.number),
      day: orderDay(order, house),
    },
    order: { number: order.number, link: order.link },
  };
}

export function drawingOf(order: MailOrder): Block[] {
  if (order.tiers.length === 0) return [];
  return [{ kind: 'drawing', tiers: order.tiers, label: order.summary }];
}

/** What, for whom and when, with every choice to read over. */
export function orderFacts(order: MailOrder, house: House): Block {
  const { pickup, collector } = order;
  return facts(
    fact('Pickup', pickup === null ? 'No day yet' : pickupText(pickup, house)),
    fact('Where', house.studio.address),
    collector === null ? null : fact('Collected by', nameInText(collector)),
    fact('For', `${oneLine(order.occasion)}, ${order.headCount} ${people(order.headCount)}`),
    fact('Cake', order.summary),
    ...order.chosen.map(({ label, value }) => fact(label, oneLine(value))),
  );
}

function people(count: number): string {
  return count === 1 ? 'person' : 'people';
}

export function pricesOf({ price }: MailOrder, { studio }: House, totalLabel: string): Block {
  const amount = (minor: number): string => formatMoney(minor, price.currency, studio.locale);
  return {
    kind: 'prices',
    lines: price.lines.map(({ label, amountMinor }) => fact(oneLine(label), amount(amountMinor))),
    total: fact(totalLabel, amount(price.totalMinor)),
  };
}

/** What is in the cake and what else is near it: never what is not. */
export function contentsOf(order: MailOrder): Block[] {
  const { contains, mayContain, handled } = order;
  const rows = [
    contains.length === 0 ? null : fact('Contains', capitalise(formatList(contains))),
    mayContain.length === 0 ? null : fact('May contain', capitalise(formatList(mayContain))),
    handled.length === 0 ? null : fact('Also handled here', capitalise(formatList(handled))),
  ].filter((row) => row !== null);
  if (rows.length === 0) return [];
  return [
    heading('What is in it'),
    facts(...rows),
    text(
      'Worked out from the ingredients of your design. If an allergy at your table is serious, please talk to us, and ask your doctor what is right for you.',
    ),
  ];
}

/** Some sentences, one below the other. */
export function sentences(words: readonly string[]): Block {
  return { kind: 'list', items: words.map((each) => ({ text: oneLine(each) })) };
}

/** How heavy, how high, how cold; and what must not be eaten. */
export function keepingOf(order: MailOrder, { studio }: House): Block[] {
  const size =
    order.weightG === 0
      ? ''
      : `It weighs about ${formatWeight(order.weightG, studio.lengthLead)} and is about ${formatLength(order.heightMm, studio.lengthLead)} high, board included.`;
  const words = [order.keepCool, size].filter((each) => each !== '').join(' ');
  return [
    ...(words === '' ? [] : [heading('Keeping it'), text(words)]),
    ...(order.beforeEating.length === 0
      ? []
      : [heading('Before you cut and eat it'), sentences(order.beforeEating)]),
  ];
}

export function openOrder(order: MailOrder, label = 'Open your order'): Block {
  return button(label, order.link);
}
