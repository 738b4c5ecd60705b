import type { Actor } from '#api/platform/actor.ts';

export type KitchenRulesAction = 'see-kitchen-rules' | 'save-kitchen-rules';

const isOwner = (actor: Actor): boolean => actor.kind === 'staff' && actor.role === 'owner';

/** All that is reckoned goes by these figures, so they are the owner's to set. */
const rules: Readonly<Record<KitchenRulesAction, (actor: Actor) => boolean>> = {
  'see-kitchen-rules': isOwner,
  'save-kitchen-rules': isOwner,
};

export function mayKitchenRules(actor: Actor, action: KitchenRulesAction): boolean {
  return rules[action](actor);
}
