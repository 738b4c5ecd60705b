import type { Deps } from '#api/modules/deps.ts';
import type { EventHandlers } from '#api/outbox/events.ts';
import { accountMailHandlers } from './account-mail.handlers.ts';
import { contentsMailHandlers } from './contents-mail.handlers.ts';
import { mailMailHandlers } from './mail-mail.handlers.ts';
import { orderMailHandlers } from './order-mail.handlers.ts';

export type MailDeps = Pick<Deps, 'clock' | 'env'>;

/**
 * What follows from each event: today, mails. A handler reads what the event is about, renders,
 * and keeps the mails under keys made from the event's own, so that repeating it adds nothing.
 * The type sees to it that no event is forgotten.
 */
export function createMailHandlers(deps: MailDeps): EventHandlers {
  return {
    ...orderMailHandlers(deps),
    ...contentsMailHandlers(deps),
    ...accountMailHandlers(deps),
    ...mailMailHandlers(deps),
  };
}
