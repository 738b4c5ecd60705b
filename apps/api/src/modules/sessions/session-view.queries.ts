import { User } from '#api/db/models/user.ts';
import type { Deps } from '#api/modules/deps.ts';
import type { SessionView } from '#shared/contracts/accounts.ts';

/** Who a session says is there. */
export type SignedInAs = {
  readonly userId: string | undefined;
  readonly secondFactor: NonNullable<SessionView['user']>['secondFactor'] | undefined;
};

/** What the client is told about who is there. */
export async function sessionViewOf(
  { env }: Pick<Deps, 'env'>,
  { userId, secondFactor = 'none' }: SignedInAs,
): Promise<SessionView> {
  const googleSignIn = env.google !== null;
  const user = userId === undefined ? null : await User.findByPk(userId);
  if (user === null || user.email === null || user.endedAt !== null) {
    return { user: null, googleSignIn };
  }
  const { id, name, email, role } = user;
  return { user: { id, name, email, role, secondFactor }, googleSignIn };
}
