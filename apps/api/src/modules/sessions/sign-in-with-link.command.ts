import type { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { openAccount } from '#api/modules/accounts/open-account.command.ts';
import type { Deps } from '#api/modules/deps.ts';
import { AppError } from '#api/platform/app-error.ts';
import { spendLink } from './spend-link.command.ts';

export type LinkSignIn = { readonly user: User; readonly next: string | null };

/**
 * Spends a sign-in link: its address is proven, its account opened if need be, and orders sent
 * from it as a guest join. Never for staff: somebody invited meanwhile uses the password.
 */
export async function signInWithLink(deps: Pick<Deps, 'clock'>, key: string): Promise<LinkSignIn> {
  return inTransaction(async () => {
    const token = await spendLink(deps, key, ['sign-in']);
    if (token.email === null) throw new AppError('link-spent');
    const user = await openAccount(deps, { email: token.email, name: null });
    if (user === null) {
      throw new AppError('sign-in-failed', { detail: 'Staff sign in with their password.' });
    }
    const { next } = token.data;
    return { user, next: typeof next === 'string' ? next : null };
  });
}
