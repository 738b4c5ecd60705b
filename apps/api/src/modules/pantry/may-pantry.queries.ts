import type { Actor } from '#api/platform/actor.ts';
import { mayPantry, type PantryAction } from './pantry.policy.ts';

/** Who may open the pantry, for what leads there. */
export function mayPantryDo(actor: Actor, action: PantryAction): boolean {
  return mayPantry(actor, action);
}
