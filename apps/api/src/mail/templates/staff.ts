import { button, fact, facts, heading, notice, text } from '../content.ts';
import type { Block } from '../content.ts';
import type { House } from '../house.ts';
import type { MailData } from '../mail-data.ts';
import { nameInText, oneLine } from '../plain.ts';
import type { Templates } from '../render-mail.ts';
import { momentText, orderDay, pickupText } from '../when.ts';
import {
  contentsOf,
  drawingOf,
  openOrder,
  orderBody,
  orderFacts,
  pricesOf,
  sentences,
} from './order-parts.ts';

type StaffTemplates = Pick<
  Templates,
  | 'new-order'
  | 'withdrawn-notice'
  | 'hold-ran-out-notice'
  | 'customer-message'
  | 'ingredient-changed-notice'
  | 'mail-given-up'
>;

/** Mails to the studio about its orders and its mail. */
export const staffTemplates: StaffTemplates = {
  'new-order': (data, house) => {
    const { order } = data;
    return orderBody(order, house, {
      title: 'A new order',
      preview: `For ${orderDay(order, house)}: ${order.summary}`,
      blocks: [
        ...first(data),
        place(data, house),
        openOrder(order, 'Open the order'),
        ...drawingOf(order),
        orderFacts(order, house),
        pricesOf(order, house, 'Estimate'),
        ...contentsOf(order).slice(0, 2),
      ],
    });
  },

  'withdrawn-notice': ({ order, reason }, house) =>
    orderBody(order, house, {
      title: 'An order was withdrawn',
      preview: order.summary,
      blocks: [
        ...(reason.trim() === '' ? [] : [{ kind: 'quote' as const, by: order.name, text: reason }]),
        facts(fact('Cake', order.summary)),
        openOrder(order, 'Open the order'),
      ],
    }),

  'hold-ran-out-notice': ({ order }, house) =>
    orderBody(order, house, {
      title: 'An order has lost its place',
      preview: order.summary,
      blocks: [
        facts(fact('Ordered by', oneLine(order.name)), fact('Cake', order.summary)),
        openOrder(order, 'Open the order'),
      ],
    }),

  'customer-message': ({ order, by, body }, house) =>
    orderBody(order, house, {
      title: 'A customer has written',
      preview: order.summary,
      blocks: [{ kind: 'quote', by, text: body }, openOrder(order, 'Answer on the order’s page')],
    }),

  'ingredient-changed-notice': ({ cause, by, orders }, house) => ({
    title: 'What is in some cakes has changed',
    preview: oneLine(cause),
    fill: {
      by: nameInText(by),
      orders:
        orders.length === 1 ? `order No. ${orders[0]?.number ?? ''}` : `${orders.length} orders`,
    },
    blocks: [
      facts(fact('Changed', oneLine(cause)), fact('By', nameInText(by))),
      ...orders.flatMap(({ number, link, pickup, changes, clashes }) => [
        heading(`No. ${number}`),
        ...(pickup === null ? [] : [text(pickupText(pickup, house))]),
        ...(clashes
          ? [
              notice(
                'stop',
                'It is against something guests told',
                'What it is stands on the order’s page and not in this e-mail.',
              ),
            ]
          : []),
        sentences(changes),
        button(`Open No. ${number}`, link),
      ]),
    ],
  }),

  'mail-given-up': ({ subject, to, reason, orderNumber, link }) => ({
    title: 'An e-mail could not be delivered',
    preview: oneLine(subject),
    fill: {},
    blocks: [
      facts(
        fact('To', oneLine(to)),
        fact('Subject', oneLine(subject)),
        orderNumber === null ? null : fact('Order', `No. ${orderNumber}`),
        fact('What the mail server said', oneLine(reason)),
      ),
      button('Read it and send it again', link),
    ],
    footnote: 'You get this because you own the studio’s order book.',
  }),
};

/** Advice on top. What guests cannot eat stays on the order's page. */
function first({ stops, cares, aboutGuests }: MailData['new-order']): Block[] {
  return [
    ...(aboutGuests === null ? [] : [guestsNotice[aboutGuests]]),
    ...stops.map((sentence) => notice('stop', 'Stop', oneLine(sentence))),
    ...cares.map((sentence) => notice('now', 'Care', oneLine(sentence))),
  ];
}

const guestsNotice = {
  allergy: notice(
    'stop',
    'An allergy was told',
    'What it is stands on the order’s page and not in this e-mail.',
  ),
  advice: notice(
    'now',
    'There is advice about the guests',
    'It stands on the order’s page and not in this e-mail.',
  ),
} as const;

function place({ hold, dateOpen }: MailData['new-order'], house: House): Block {
  if (hold === null) {
    return text(
      dateOpen
        ? 'The plan found no place for it by itself: it is asked for without a promise.'
        : 'No place is kept for it.',
    );
  }
  const until = momentText(hold.expiresAt, house);
  return text(
    hold.needsLink
      ? `Its place is kept until ${until}, and longer once the customer opens the link in our e-mail.`
      : `Its place is kept until ${until}.`,
  );
}
