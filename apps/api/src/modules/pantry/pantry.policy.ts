import type { StaffRole } from '#shared/contracts/vocabulary.ts';
import type { Actor } from '#api/platform/actor.ts';

/** Reading the pantry shows what things cost, so it is for those who may change it. */
export type PantryAction = 'see' | 'save';

const allowed: Readonly<Record<PantryAction, readonly StaffRole[]>> = {
  see: ['baker', 'owner'],
  save: ['baker', 'owner'],
};

/** Whether the actor may do this with formulas and ingredients. */
export function mayPantry(actor: Actor, action: PantryAction): boolean {
  return actor.kind === 'staff' && allowed[action].includes(actor.role);
}
