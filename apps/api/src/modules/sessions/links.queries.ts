import { Token } from '#api/db/models/token.ts';
import type { Deps } from '#api/modules/deps.ts';
import { AppError } from '#api/platform/app-error.ts';
import { hashKey } from '#api/platform/ids.ts';

/** The link a key opens, unspent; throws `link-spent` alike for unknown, used and run out. */
export async function findLink({ clock }: Pick<Deps, 'clock'>, key: string): Promise<Token> {
  const token = await Token.findOne({ where: { hash: hashKey(key) } });
  if (token === null || token.usedAt !== null || token.expiresAt <= clock.now()) {
    throw new AppError('link-spent');
  }
  return token;
}
