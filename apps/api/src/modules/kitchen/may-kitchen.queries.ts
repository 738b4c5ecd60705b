import type { Actor } from '#api/platform/actor.ts';
import { mayKitchen, type KitchenAction } from './kitchen.policy.ts';

/** Who may see what goes into cakes and what they cost, for what stands beside it. */
export function mayKitchenDo(actor: Actor, action: KitchenAction): boolean {
  return mayKitchen(actor, action);
}
