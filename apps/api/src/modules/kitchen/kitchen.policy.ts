import type { StaffRole } from '#shared/contracts/vocabulary.ts';
import type { Actor } from '#api/platform/actor.ts';

/** What goes into cakes is for those who bake them; what they cost and leave, for the owner. */
export type KitchenAction = 'see-kitchen-sheet' | 'plan-eggs' | 'plan-shopping' | 'see-order-cost';

const bakers: readonly StaffRole[] = ['baker', 'owner'];
const owners: readonly StaffRole[] = ['owner'];

const allowed: Readonly<Record<KitchenAction, readonly StaffRole[]>> = {
  'see-kitchen-sheet': bakers,
  'plan-eggs': bakers,
  'plan-shopping': bakers,
  'see-order-cost': owners,
};

export function mayKitchen(actor: Actor, action: KitchenAction): boolean {
  return actor.kind === 'staff' && allowed[action].includes(actor.role);
}
