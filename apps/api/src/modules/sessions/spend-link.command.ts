import { changeOne } from '#api/db/change-one.ts';
import { Token, type TokenPurpose } from '#api/db/models/token.ts';
import type { Deps } from '#api/modules/deps.ts';
import { AppError } from '#api/platform/app-error.ts';
import { findLink } from './links.queries.ts';

/**
 * Spends a link, once: of two presses the second is refused. In the transaction of what it is
 * for, so that a failure there leaves it unspent. Throws `link-spent`.
 */
export async function spendLink(
  { clock }: Pick<Deps, 'clock'>,
  key: string,
  purposes: readonly TokenPurpose[],
): Promise<Token> {
  const token = await findLink({ clock }, key);
  if (!purposes.includes(token.purpose)) throw new AppError('link-spent');
  const spent = await changeOne(Token, { usedAt: clock.now() }, { id: token.id, usedAt: null });
  if (!spent) throw new AppError('link-spent');
  return token;
}
