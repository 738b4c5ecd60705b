import type { OrderView } from '#shared/contracts/orders.ts';
import type { OrderStatus } from '#shared/contracts/vocabulary.ts';

/** What the page says first, by the order's state. */
export const orderHeadings: Readonly<Record<OrderStatus, string>> = {
  asked: 'We have your order',
  quoted: 'Your price is ready',
  agreed: 'We are agreed',
  confirmed: 'Your cake is confirmed',
  making: 'Your cake is in the kitchen',
  ready: 'Your cake is ready',
  collected: 'Your cake is with you',
  declined: 'We cannot make this one',
  withdrawn: 'You have withdrawn this order',
  lapsed: 'This order has run out of time',
  cancelled: 'This order is cancelled',
  uncollected: 'Your cake was not collected',
};

/** A state in a word, for lists. */
export const orderWords: Readonly<Record<OrderStatus, string>> = {
  asked: 'received',
  quoted: 'price ready',
  agreed: 'agreed',
  confirmed: 'confirmed',
  making: 'in the kitchen',
  ready: 'ready to collect',
  collected: 'collected',
  declined: 'declined',
  withdrawn: 'withdrawn',
  lapsed: 'lapsed',
  cancelled: 'cancelled',
  uncollected: 'not collected',
};

/** The stages a customer sees, and how much of the drawing each fills in. */
export const stages = [
  { stage: 'received', name: 'Received', made: 0.12 },
  { stage: 'agreed', name: 'Agreed', made: 0.34 },
  { stage: 'in-the-kitchen', name: 'In the kitchen', made: 0.7 },
  { stage: 'ready', name: 'Ready', made: 1 },
] as const;

/** How far along the stages an order is, -1 once it has ended otherwise. */
export function stageIndex(stage: OrderView['stage']): number {
  if (stage === 'collected') return stages.length - 1;
  return stages.findIndex((it) => it.stage === stage);
}
