import type { Actor } from '#api/platform/actor.ts';

export type PeopleAction =
  'list-people' | 'invite-staff' | 'send-invitation-again' | 'change-role' | 'end-role';

/** The member of staff (or the invitation) it is about; null where it is about nobody yet. */
export type PersonSubject = {
  readonly userId: string | null;
  readonly state: 'active' | 'invited' | 'ended';
} | null;

type Rule = (actor: Actor, subject: PersonSubject) => boolean;

const isOwner = (actor: Actor): boolean => actor.kind === 'staff' && actor.role === 'owner';
const isSelf = (actor: Actor, subject: PersonSubject): boolean =>
  actor.kind === 'staff' && actor.userId === subject?.userId;

/** People are the owner's; nobody changes or ends their own role, so that an owner always remains. */
const rules: Readonly<Record<PeopleAction, Rule>> = {
  'list-people': isOwner,
  'invite-staff': isOwner,
  'send-invitation-again': (actor, subject) => isOwner(actor) && subject?.state === 'invited',
  'change-role': (actor, subject) =>
    isOwner(actor) && subject?.state === 'active' && !isSelf(actor, subject),
  'end-role': (actor, subject) =>
    isOwner(actor) &&
    (subject?.state === 'active' || subject?.state === 'invited') &&
    !isSelf(actor, subject),
};

/** Whether the actor may do this about that person. */
export function mayPeople(
  actor: Actor,
  action: PeopleAction,
  subject: PersonSubject = null,
): boolean {
  return rules[action](actor, subject);
}
