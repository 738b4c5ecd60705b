/** What the staff can do to an order; each opens its own dialog. */
export const orderActs = [
  'confirm',
  'decline',
  'move',
  'start',
  'ready',
  'collect',
  'uncollected',
] as const;
export type OrderAct = (typeof orderActs)[number];

export const actWords: Readonly<Record<OrderAct, string>> = {
  confirm: 'Confirm',
  decline: 'Decline',
  move: 'Move the pickup',
  start: 'Start making it',
  ready: 'Mark ready',
  collect: 'Collected',
  uncollected: 'Not collected',
};
