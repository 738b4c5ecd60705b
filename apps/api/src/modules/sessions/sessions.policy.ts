import type { Actor } from '#api/platform/actor.ts';

export type SessionAction = 'list-sessions' | 'end-session' | 'change-password' | 'link-google';

const isSignedIn = (actor: Actor): boolean => actor.kind === 'customer' || actor.kind === 'staff';

/** Everybody's own sessions are theirs; passwords are for staff, customers have none. */
const rules: Readonly<Record<SessionAction, (actor: Actor) => boolean>> = {
  'list-sessions': isSignedIn,
  'end-session': isSignedIn,
  'change-password': (actor) => actor.kind === 'staff',
  'link-google': isSignedIn,
};

/** Whether the actor may do this to their own sign-in. */
export function maySession(actor: Actor, action: SessionAction): boolean {
  return rules[action](actor);
}
