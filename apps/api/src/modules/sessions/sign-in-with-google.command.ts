import { Identity } from '#api/db/models/identity.ts';
import { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { GoogleProfile } from '#api/clients/google.ts';
import { joinGuestOrders } from '#api/modules/accounts/join-guest-orders.command.ts';
import { openAccount } from '#api/modules/accounts/open-account.command.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteAudit } from '#api/modules/note-audit.ts';

/** Why Google's word was not enough, as the sign-in page explains it. */
export type GoogleRefusal = 'google-unverified' | 'google-staff' | 'google-ended' | 'google-taken';

export type GoogleSignIn =
  | { readonly user: User; readonly refusal: null }
  | { readonly user: null; readonly refusal: GoogleRefusal };

const refused = (refusal: GoogleRefusal): GoogleSignIn => ({ user: null, refusal });

/**
 * Signs in whoever this Google account is. It is known by its `sub`; a new one joins the
 * customer's account of its address, or opens one, only if Google says the address is verified,
 * and never joins a member of staff's.
 */
export async function signInWithGoogle(
  deps: Pick<Deps, 'clock'>,
  profile: GoogleProfile,
): Promise<GoogleSignIn> {
  return inTransaction(async () => {
    const now = deps.clock.now();
    const identity = await findIdentity(profile.sub);
    if (identity !== null) {
      const user = await User.findByPk(identity.userId);
      if (user === null || user.endedAt !== null || user.erasedAt !== null) {
        return refused('google-ended');
      }
      await identity.update({ lastUsedAt: now });
      await user.update({ lastSignedInAt: now });
      const proven = profile.emailVerified && user.email === profile.email;
      if (proven && user.role === 'customer') await joinGuestOrders(user);
      return { user, refusal: null };
    }
    if (!profile.emailVerified) return refused('google-unverified');
    const user = await openAccount(deps, { email: profile.email, name: profile.name });
    if (user === null) return refused('google-staff');
    await addIdentity(user.id, profile.sub, now);
    return { user, refusal: null };
  });
}

/** Lets somebody who is signed in use this Google account from now on; staff only come by it so. */
export async function linkGoogle(
  { clock }: Pick<Deps, 'clock'>,
  user: User,
  profile: GoogleProfile,
): Promise<GoogleSignIn> {
  return inTransaction(async () => {
    const identity = await findIdentity(profile.sub);
    if (identity !== null && identity.userId !== user.id) return refused('google-taken');
    if (identity === null) {
      await addIdentity(user.id, profile.sub, clock.now());
      await noteAudit('system', {
        action: 'link-google',
        subjectKind: 'user',
        subjectId: user.id,
      });
    }
    return { user, refusal: null };
  });
}

function findIdentity(subject: string): Promise<Identity | null> {
  return Identity.findOne({ where: { provider: 'google', subject } });
}

async function addIdentity(userId: string, subject: string, now: Date): Promise<void> {
  await Identity.create({ userId, provider: 'google', subject, lastUsedAt: now });
}
