import type { OrderEvent } from '#api/db/models/order-event.ts';
import { formatDay, formatTime } from '#shared/dates/format.ts';
import type { OrderEventKind } from '#api/modules/orders/note-order-event.command.ts';

const sentences: Record<OrderEventKind, string> = {
  submitted: 'Sent the order.',
  confirmed: 'Confirmed it.',
  declined: 'Declined it.',
  withdrawn: 'Withdrew it.',
  moved: 'Moved the pickup.',
  started: 'Started making it.',
  ready: 'Marked it ready.',
  collected: 'Handed it over.',
  uncollected: 'Marked it as not collected.',
  'hold-ran-out': 'Its place in the plan ran out.',
  'link-opened': 'Opened the private link.',
  'link-renewed': 'Renewed the private link.',
  'message-written': 'Wrote a message.',
  'photo-added': 'Added a photo.',
  'allergy-answered': 'Answered an allergy.',
  'warmth-asked': 'Asked the customer how warm it will be.',
  'stop-talked': 'Recorded a talk about a stop.',
  'stop-lifted': 'Lifted a stop, with a reason.',
  'lifted-stop-accepted': 'Read and accepted the reason for a lifted stop.',
  'contents-changed': 'Changed what is in it, by a label or a formula.',
  'contents-put-right': 'Put right what had changed in it.',
  'contents-acknowledged': 'Saw to what has changed in it.',
  'contents-told': 'Told the customer what has changed in it.',
  'mail-sent-again': 'Sent an e-mail again.',
};

const isKnown = (kind: string): kind is OrderEventKind => Object.hasOwn(sentences, kind);

/** What happened, in a sentence; who did it stands beside it. */
export function sentenceOf(event: OrderEvent): string {
  const { kind, data } = event;
  const { fromDate, fromStart } = data;
  if (kind === 'moved' && typeof fromDate === 'string' && typeof fromStart === 'number') {
    return `Moved the pickup from ${formatDay(fromDate)}, ${formatTime(fromStart)}.`;
  }
  if (kind === 'submitted' && data['dateAnswer'] === 'ask-us') {
    return 'Sent the order, without a promised day.';
  }
  return isKnown(kind) ? sentences[kind] : `${kind}.`;
}
