import type { Actor } from '#api/platform/actor.ts';

export type AccountAction = 'see-account' | 'export-account' | 'erase-account';

const isCustomer = (actor: Actor): boolean => actor.kind === 'customer';

/** A customer's account is theirs alone; staff have a role, which the owner ends. */
const rules: Readonly<Record<AccountAction, (actor: Actor) => boolean>> = {
  'see-account': isCustomer,
  'export-account': isCustomer,
  'erase-account': isCustomer,
};

/** Whether the actor may do this with their own account. */
export function mayAccount(actor: Actor, action: AccountAction): boolean {
  return rules[action](actor);
}
