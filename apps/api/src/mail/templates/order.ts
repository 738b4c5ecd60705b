import { formatDay } from '#shared/dates/format.ts';
import type { Templates } from '../render-mail.ts';
import { fact, facts, heading, notice, text } from '../content.ts';
import type { Block } from '../content.ts';
import type { House } from '../house.ts';
import type { MailData } from '../mail-data.ts';
import { nameInText, oneLine, proseOf } from '../plain.ts';
import { momentText, orderDay, pickupText } from '../when.ts';
import {
  contentsOf,
  drawingOf,
  keepingOf,
  openOrder,
  orderBody,
  orderFacts,
  pricesOf,
  sentences,
} from './order-parts.ts';

type OrderTemplates = Pick<
  Templates,
  | 'order-received'
  | 'confirmed'
  | 'declined'
  | 'withdrawn'
  | 'moved'
  | 'hold-ran-out'
  | 'warmth-asked'
  | 'stop-lifted'
  | 'private-link-renewed'
  | 'ingredient-changed'
  | 'message'
  | 'ready'
  | 'thank-you'
>;

/** Mails to whoever ordered. */
export const orderTemplates: OrderTemplates = {
  'order-received': (data, house) => {
    const { order, stops, cares } = data;
    return orderBody(order, house, {
      title: 'We have your order',
      preview: `For ${orderDay(order, house)}: ${order.summary}`,
      blocks: [
        ...placeKept(data, house),
        ...drawingOf(order),
        orderFacts(order, house),
        pricesOf(order, house, 'Estimate'),
        text(
          'This is an estimate: it binds neither you nor us. The price is settled when we confirm.',
        ),
        ...stops.map((each) => notice('stop', 'To settle before we confirm', oneLine(each))),
        ...(cares.length === 0 ? [] : [heading('Worth knowing'), sentences(cares)]),
        ...contentsOf(order),
      ],
    });
  },

  confirmed: ({ order, note }, house) =>
    orderBody(order, house, {
      title: 'Your order is confirmed',
      preview: `${order.summary}, ready for ${orderDay(order, house)}`,
      blocks: [
        ...fromUs(note, house),
        ...drawingOf(order),
        orderFacts(order, house),
        pricesOf(order, house, 'Agreed price'),
        openOrder(order),
        ...contentsOf(order),
        ...keepingOf(order, house),
      ],
    }),

  declined: ({ order, reason, nearest }, house) =>
    orderBody(order, house, {
      title: 'We cannot take this order',
      preview: `Your order for ${orderDay(order, house)}`,
      blocks: [
        ...fromUs(reason, house),
        ...(nearest.length === 0
          ? []
          : [
              heading('Days when we could make it'),
              {
                kind: 'list' as const,
                items: nearest.map((date) => ({
                  text: formatDay(date, { locale: house.studio.locale, year: true }),
                  url: `${house.publicUrl}/order/day?date=${date}`,
                })),
              },
              text('They are open as we write this, and not kept for you yet.'),
            ]),
        openOrder(order),
      ],
    }),

  withdrawn: ({ order }, house) =>
    orderBody(order, house, {
      title: 'Your order is withdrawn',
      preview: `Your order for ${orderDay(order, house)}`,
      blocks: [facts(fact('Cake', order.summary)), openOrder(order)],
    }),

  moved: ({ order, from, note, calendar }, house) =>
    orderBody(order, house, {
      title: 'Your pickup has moved',
      preview: order.pickup === null ? '' : pickupText(order.pickup, house),
      blocks: [
        facts(
          fact('Now', order.pickup === null ? 'No day yet' : pickupText(order.pickup, house)),
          from === null ? null : fact('Before', pickupText(from, house)),
          fact('Where', house.studio.address),
          fact('Cake', order.summary),
        ),
        ...(calendar ? [text('The file with this e-mail moves it in your calendar.')] : []),
        ...fromUs(note, house),
        openOrder(order),
      ],
    }),

  'hold-ran-out': ({ order }, house) =>
    orderBody(order, house, {
      title: 'Your date is not kept any more',
      preview: `Your order for ${orderDay(order, house)} is still with us`,
      blocks: [facts(fact('Cake', order.summary)), openOrder(order)],
    }),

  'warmth-asked': ({ order }, house) =>
    orderBody(order, house, {
      title: 'How warm will it be?',
      preview: `Where your cake stands on ${orderDay(order, house)}`,
      blocks: [
        facts(
          fact('Cake', order.summary),
          order.pickup === null ? null : fact('Pickup', pickupText(order.pickup, house)),
        ),
        notice(
          'now',
          'What we would like to know',
          'The warmest it will get where the cake stands, in °F or °C, and whether it stands in the shade. A forecast is good enough.',
        ),
        text(
          'If that is more than we have reckoned with, we tell you what would hold better. Nothing is changed without you.',
        ),
        openOrder(order, 'Tell us on your order’s page'),
      ],
    }),

  'stop-lifted': ({ order }, house) =>
    orderBody(order, house, {
      title: 'Please read this about your cake',
      preview: 'We confirm your order once you have read it',
      blocks: [
        facts(fact('Cake', order.summary), fact('For', orderDay(order, house))),
        notice(
          'now',
          'It waits for you',
          'What it is about, and why we take it, is on your order’s page only. Nothing is confirmed before you have read and accepted it there.',
        ),
        openOrder(order, 'Read it'),
      ],
    }),

  'private-link-renewed': ({ order }, house) =>
    orderBody(order, house, {
      title: 'A new link to your order',
      preview: `Your order for ${orderDay(order, house)}`,
      blocks: [openOrder(order)],
    }),

  'ingredient-changed': ({ order, changes }, house) =>
    orderBody(order, house, {
      title: 'Something in your cake has changed',
      preview: oneLine(changes[0] ?? ''),
      blocks: [
        ...changes.map((each) => notice('now', 'New', oneLine(each))),
        ...contentsOf(order),
        openOrder(order),
      ],
    }),

  message: ({ order, by, body }, house) =>
    orderBody(order, house, {
      title: 'A message about your order',
      preview: opening(body),
      blocks: [{ kind: 'quote', by, text: body }, openOrder(order, 'Answer on your order’s page')],
    }),

  ready: ({ order, openings }, house) =>
    orderBody(order, house, {
      title: 'Your cake is ready',
      preview: order.pickup === null ? '' : pickupText(order.pickup, house),
      blocks: [
        ...drawingOf(order),
        facts(
          order.pickup === null ? null : fact('Pickup', pickupText(order.pickup, house)),
          fact('Where', house.studio.address),
          openings.length === 0 ? null : fact('Open for pickups', openings.join('\n')),
          order.collector === null ? null : fact('Collected by', nameInText(order.collector)),
        ),
        heading('Getting it home'),
        sentences([
          'Cool the car before you load it.',
          'Carry it level, with both hands under the board.',
          'Put it on a flat floor, never on a seat or a lap, with nothing that can slide against it.',
          'Take corners and bumps slowly.',
        ]),
        ...keepingOf(order, house),
        openOrder(order),
      ],
    }),

  'thank-you': ({ order }, house) =>
    orderBody(order, house, {
      title: 'Thank you',
      preview: `From all of us at ${house.studio.name}`,
      blocks: [...keepingOf(order, house), openOrder(order)],
    }),
};

/** Whether a place is kept, until when, and what keeps it longer. */
function placeKept(data: MailData['order-received'], house: House): Block[] {
  const { order, hold, dateOpen, answerHours } = data;
  if (hold === null) {
    const words = dateOpen
      ? 'We could not promise this day by ourselves: a baker looks at it and writes to you. No place is kept until then.'
      : 'No place is kept for this day yet. A baker looks at it and writes to you.';
    return [notice('now', 'Your day is not settled yet', words), openOrder(order)];
  }
  const until = momentText(hold.expiresAt, house);
  if (!hold.needsLink) {
    const words = `A place is kept for you until ${until}. We answer before then.`;
    return [notice('quiet', 'Your day is kept', words), openOrder(order)];
  }
  const words = `Your day is kept until ${until}. Open your order before then, and we keep it until we have answered: at most ${answerHours} hours.`;
  return [notice('now', 'Please open your order once', words), openOrder(order, 'Keep my day')];
}

function fromUs(words: string, { studio }: House): Block[] {
  return words.trim() === '' ? [] : [{ kind: 'quote', by: studio.name, text: words }];
}

/** The first words of a message. */
function opening(body: string): string {
  return Array.from(proseOf(body).replaceAll(/\s+/g, ' ')).slice(0, 90).join('');
}
