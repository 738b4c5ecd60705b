import type { MailAttachment } from '#api/db/json-shapes.ts';
import { LiftedStop } from '#api/db/models/lifted-stop.ts';
import { Message } from '#api/db/models/message.ts';
import { OrderEvent } from '#api/db/models/order-event.ts';
import { Studio } from '#api/db/models/studio.ts';
import { WeeklyPickupWindow } from '#api/db/models/weekly-pickup-window.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { MailData, MailPickup, MailTemplate } from '#api/mail/mail-data.ts';
import { renderMail } from '#api/mail/render-mail.ts';
import { calendarFileOf } from '#api/modules/orders/calendar-file.queries.ts';
import { offeredDatesOf } from '#api/modules/orders/orders.queries.ts';
import { activeHoldsOf } from '#api/modules/plan/plan.queries.ts';
import type { EventHandlers, HandlerContext } from '#api/outbox/events.ts';
import { confirmedMail } from './confirmed-mail.queries.ts';
import type { MailDeps } from './mail-handlers.ts';
import { adviceToTell, hasGuestAdvice, loadToldOrder } from './mail-order.queries.ts';
import type { ToldOrder } from './mail-order.queries.ts';
import { openingsOf } from './openings.ts';
import { queueMail } from './queue-mail.command.ts';
import type { MailToQueue } from './queue-mail.command.ts';

type OrderMailHandlers = Pick<
  EventHandlers,
  | 'order-asked'
  | 'order-confirmed'
  | 'order-declined'
  | 'order-withdrawn'
  | 'order-moved'
  | 'order-ready'
  | 'order-collected'
  | 'hold-ran-out'
  | 'warmth-to-ask'
  | 'stop-lifted'
  | 'private-link-renewed'
  | 'message-written'
>;

/** Mails about orders, to whoever ordered and to the studio's own inbox. */
export function orderMailHandlers(deps: MailDeps): OrderMailHandlers {
  const { toCustomer, toStudio } = sendersOf(deps);

  const calendarAttachment = async ({ record }: ToldOrder): Promise<MailAttachment> => {
    const file = await calendarFileOf(record.order.id, deps.env.publicUrl);
    return {
      filename: `pickup-${record.order.number}.ics`,
      contentType: 'text/calendar; charset=utf-8; method=PUBLISH',
      base64: Buffer.from(file).toString('base64'),
    };
  };

  return {
    async 'order-asked'({ orderId }, context) {
      const told = await loadToldOrder(deps, orderId);
      const { order, revision } = told.record;
      const holds = await activeHoldsOf([orderId]);
      const place = {
        hold: holds.get(orderId) ?? null,
        dateOpen: order.dateAnswer === 'ask-us',
      };
      const { answerHours } = await Studio.findByPk(1, { rejectOnEmpty: true });
      const { estimate } = revision;
      const cares = adviceToTell(estimate, 'care');
      const stops = adviceToTell(estimate, 'stop');
      await inTransaction(async () => {
        await toCustomer(told, context, 'order-received', {
          ...place,
          order: told.forCustomer,
          stops,
          cares,
          answerHours,
        });
        await toStudio(told, context, 'new-order', {
          ...place,
          order: told.forStaff,
          stops,
          cares,
          aboutGuests: aboutGuests(told),
        });
      });
    },

    async 'order-confirmed'({ orderId }, context) {
      const told = await loadToldOrder(deps, orderId);
      const calendar = await calendarAttachment(told);
      await toCustomer(told, context, 'confirmed', await confirmedMail(told), [calendar]);
    },

    async 'order-declined'({ orderId }, context) {
      const told = await loadToldOrder(deps, orderId);
      await toCustomer(told, context, 'declined', {
        order: told.forCustomer,
        reason: told.record.order.endedReason ?? '',
        nearest: await offeredDatesOf(orderId),
      });
    },

    async 'order-withdrawn'({ orderId }, context) {
      const told = await loadToldOrder(deps, orderId);
      const reason = told.record.order.endedReason ?? '';
      await inTransaction(async () => {
        await toCustomer(told, context, 'withdrawn', { order: told.forCustomer });
        await toStudio(told, context, 'withdrawn-notice', { order: told.forStaff, reason });
      });
    },

    async 'order-moved'({ orderId }, context) {
      const told = await loadToldOrder(deps, orderId);
      const { order, revision } = told.record;
      // A pickup that is only asked for is in nobody's calendar yet.
      const calendar = order.confirmedAt !== null && order.pickupDate !== null;
      const data = {
        order: told.forCustomer,
        from: await movedFrom(orderId),
        note: revision.changeNote ?? '',
        calendar,
      };
      const attachments = calendar ? [await calendarAttachment(told)] : [];
      await toCustomer(told, context, 'moved', data, attachments);
    },

    async 'order-ready'({ orderId }, context) {
      const told = await loadToldOrder(deps, orderId);
      const windows = await WeeklyPickupWindow.findAll({ where: { active: true } });
      await toCustomer(told, context, 'ready', {
        order: told.forCustomer,
        openings: openingsOf(windows, told.house.studio.locale),
      });
    },

    async 'order-collected'({ orderId }, context) {
      const told = await loadToldOrder(deps, orderId);
      await toCustomer(told, context, 'thank-you', { order: told.forCustomer });
    },

    async 'hold-ran-out'({ orderId }, context) {
      const told = await loadToldOrder(deps, orderId);
      await inTransaction(async () => {
        await toCustomer(told, context, 'hold-ran-out', { order: told.forCustomer });
        await toStudio(told, context, 'hold-ran-out-notice', { order: told.forStaff });
      });
    },

    async 'warmth-to-ask'({ orderId }, context) {
      const told = await loadToldOrder(deps, orderId);
      await toCustomer(told, context, 'warmth-asked', { order: told.forCustomer });
    },

    async 'stop-lifted'({ orderId, liftedStopId }, context) {
      const { acceptedAt } = await LiftedStop.findByPk(liftedStopId, { rejectOnEmpty: true });
      // Read and accepted on the page meanwhile: there is nothing to ask any more.
      if (acceptedAt !== null) return;
      const told = await loadToldOrder(deps, orderId);
      await toCustomer(told, context, 'stop-lifted', { order: told.forCustomer });
    },

    async 'private-link-renewed'({ orderId }, context) {
      const told = await loadToldOrder(deps, orderId);
      await toCustomer(told, context, 'private-link-renewed', { order: told.forCustomer });
    },

    async 'message-written'({ orderId, messageId }, context) {
      const message = await Message.findByPk(messageId, { rejectOnEmpty: true });
      if (message.erasedAt !== null) return;
      const { sender, authorName: by, body } = message;
      const told = await loadToldOrder(deps, orderId);
      if (sender === 'customer') {
        const order = told.forStaff;
        await toStudio(told, context, 'customer-message', { order, by, body });
      } else {
        const order = told.forCustomer;
        await toCustomer(told, context, 'message', { order, by, body });
      }
    },
  };
}

type Sender = <T extends MailTemplate>(
  told: ToldOrder,
  context: HandlerContext,
  template: T,
  data: MailData[T],
  attachments?: MailToQueue['attachments'],
) => Promise<void>;

function sendersOf(deps: MailDeps): { toCustomer: Sender; toStudio: Sender } {
  const queue = (
    told: ToldOrder,
    { outboxId, uniqueKey }: HandlerContext,
    mail: Pick<MailToQueue, 'template' | 'rendered' | 'to' | 'replyTo' | 'attachments'>,
  ): Promise<void> =>
    queueMail(deps, {
      ...mail,
      outboxId,
      orderId: told.record.order.id,
      uniqueKey: `${uniqueKey}:${mail.template}`,
    });
  return {
    async toCustomer(told, context, template, data, attachments) {
      // Taken at the counter without an address, or erased.
      if (told.email === null) return;
      const rendered = renderMail(template, data, told.house);
      const replyTo = told.house.studio.email;
      await queue(told, context, { template, rendered, to: told.email, replyTo, attachments });
    },
    async toStudio(told, context, template, data) {
      const rendered = renderMail(template, data, told.house);
      const to = told.house.studio.email;
      await queue(told, context, { template, rendered, to, replyTo: null });
    },
  };
}

/** Whether something about who will eat must be read; never what. */
function aboutGuests({ record }: ToldOrder): MailData['new-order']['aboutGuests'] {
  const { allergies, estimate } = record.revision;
  if ((allergies ?? []).length > 0) return 'allergy';
  return hasGuestAdvice(estimate) ? 'advice' : null;
}

/** Where the last move took the pickup from. */
async function movedFrom(orderId: string): Promise<MailPickup | null> {
  const moved = await OrderEvent.findOne({
    where: { orderId, kind: 'moved' },
    order: [['seq', 'DESC']],
  });
  const { fromDate, fromStart, fromMinutes } = moved?.data ?? {};
  if (typeof fromDate !== 'string') return null;
  if (typeof fromStart !== 'number' || typeof fromMinutes !== 'number') return null;
  return { date: fromDate, start: fromStart, minutes: fromMinutes };
}
