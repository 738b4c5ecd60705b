import type { Actor } from '#api/platform/actor.ts';

export type AllergyTableAction = 'see-allergy-table' | 'save-allergy-table';

const isOwner = (actor: Actor): boolean => actor.kind === 'staff' && actor.role === 'owner';

/** What the studio takes, talks over and refuses is the owner's to say. */
const rules: Readonly<Record<AllergyTableAction, (actor: Actor) => boolean>> = {
  'see-allergy-table': isOwner,
  'save-allergy-table': isOwner,
};

export function mayAllergyTable(actor: Actor, action: AllergyTableAction): boolean {
  return rules[action](actor);
}
