import type { Actor, Customer, Staff } from '#api/platform/actor.ts';
import { AppError, notFound } from '#api/platform/app-error.ts';

/**
 * Turns a policy's no into a refusal that says what would help: signing in, the second factor, or
 * nothing, because the role may not.
 */
export function authorise(actor: Actor, allowed: boolean): void {
  if (allowed) return;
  if (actor.kind === 'visitor' && actor.awaiting === 'second-factor') {
    throw new AppError('second-factor-needed');
  }
  const known = actor.kind === 'customer' || actor.kind === 'staff';
  throw new AppError(known ? 'not-allowed' : 'not-signed-in');
}

/** For one thing that belongs to somebody: whose it is not learns not even that it is there. */
export function reveal(allowed: boolean): void {
  if (!allowed) throw notFound();
}

/** The actor as a member of staff; refuses anybody else, should a policy have let them through. */
export function requireStaff(actor: Actor): Staff {
  if (actor.kind === 'staff') return actor;
  authorise(actor, false);
  throw new AppError('not-allowed');
}

/** The actor as somebody with an account; refuses anybody else in the same way. */
export function requireSignedIn(actor: Actor): Customer | Staff {
  if (actor.kind === 'staff' || actor.kind === 'customer') return actor;
  authorise(actor, false);
  throw new AppError('not-allowed');
}

/** The actor as a customer; refuses anybody else in the same way. */
export function requireCustomer(actor: Actor): Customer {
  if (actor.kind === 'customer') return actor;
  authorise(actor, false);
  throw new AppError('not-allowed');
}
