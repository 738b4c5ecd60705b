import { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { enqueue } from '#api/outbox/enqueue.ts';
import { issueLink } from './issue-link.command.ts';

/**
 * Sends a one-time link to an address, whether it is known or not: using it proves the address
 * and opens an account if there is none. Staff get told that they sign in with their password.
 */
export async function requestSignInLink(
  deps: Pick<Deps, 'clock' | 'env'>,
  { email, next }: { readonly email: string; readonly next: string | null },
): Promise<void> {
  await inTransaction(async () => {
    const user = await User.findOne({ where: { email } });
    if (user !== null && user.role !== 'customer' && user.endedAt === null) {
      const minute = Math.floor(deps.clock.now().getTime() / 60_000);
      await enqueue(
        'sign-in-link-refused',
        { userId: user.id },
        { uniqueKey: `sign-in-link-refused:${user.id}:${minute}` },
      );
      return;
    }
    const token = await issueLink(deps, {
      purpose: 'sign-in',
      userId: user?.id ?? null,
      email,
      data: next === null ? {} : { next },
    });
    await enqueue(
      'sign-in-link-asked',
      { tokenId: token.id },
      { uniqueKey: `sign-in-link-asked:${token.id}` },
    );
  });
}
