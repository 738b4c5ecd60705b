import type { Actor } from '#api/platform/actor.ts';

export type PricesAction = 'see-prices' | 'save-prices';

const isOwner = (actor: Actor): boolean => actor.kind === 'staff' && actor.role === 'owner';

/** Prices are the owner's: the book also says what an hour costs and what is to be left. */
const rules: Readonly<Record<PricesAction, (actor: Actor) => boolean>> = {
  'see-prices': isOwner,
  'save-prices': isOwner,
};

export function mayPrices(actor: Actor, action: PricesAction): boolean {
  return rules[action](actor);
}
