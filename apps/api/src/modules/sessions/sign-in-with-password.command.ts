import { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { AppError } from '#api/platform/app-error.ts';
import { passwordMatches } from '#api/platform/passwords.ts';
import { countAttempt, forgiveAttempts } from './attempts.ts';

/**
 * Staff by e-mail address and password. An unknown address, a customer's, one whose role ended and
 * a wrong password get one answer that takes one time. Throws `sign-in-failed`, `too-many-requests`.
 */
export async function signInWithPassword(
  deps: Pick<Deps, 'clock'>,
  given: { readonly email: string; readonly password: string; readonly address: string },
): Promise<User> {
  const attempt = { account: `password:${given.email}`, address: given.address };
  await countAttempt(deps, attempt);
  const user = await User.findOne({ where: { email: given.email } });
  const staff = user !== null && user.role !== 'customer' && user.endedAt === null ? user : null;
  const matches = await passwordMatches(staff?.passwordHash ?? null, given.password);
  if (staff === null || !matches) throw new AppError('sign-in-failed');
  await inTransaction(async () => {
    await forgiveAttempts(attempt);
    await staff.update({ lastSignedInAt: deps.clock.now() });
  });
  return staff;
}
