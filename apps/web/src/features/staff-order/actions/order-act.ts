/** What the staff can do to an order; each opens its own dialog. */
export const orderActs = [
  'confirm',
  'start',
  'ready',
  'collect',
  'move',
  'uncollected',
  'decline',
] as const;
export type OrderAct = (typeof orderActs)[number];

export const actWords: Readonly<Record<OrderAct, string>> = {
  confirm: 'Confirm',
  decline: 'Decline',
  move: 'Move the pickup',
  start: 'Start making it',
  ready: 'Mark ready',
  collect: 'Hand over',
  uncollected: 'Not collected',
};
