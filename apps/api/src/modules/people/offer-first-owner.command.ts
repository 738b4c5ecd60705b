import { Op } from 'sequelize';
import { Token } from '#api/db/models/token.ts';
import { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { issueLink } from '#api/modules/sessions/issue-link.command.ts';
import { keyOfLink, linkAddress } from '#api/platform/links.ts';

/**
 * The address at which the first owner makes their account, to be printed where the program
 * starts; null once anybody has ever worked here. An older one that was never used is void.
 */
export async function offerFirstOwner(deps: Pick<Deps, 'clock' | 'env'>): Promise<string | null> {
  return inTransaction(async () => {
    if ((await User.count({ where: { role: { [Op.ne]: 'customer' } } })) > 0) return null;
    await Token.update(
      { usedAt: deps.clock.now() },
      { where: { purpose: 'first-owner', usedAt: { [Op.is]: null } } },
    );
    const token = await issueLink(deps, { purpose: 'first-owner', role: 'owner' });
    const key = keyOfLink(deps.env.sessionSecret, token);
    return linkAddress(deps.env.publicUrl, token.purpose, key);
  });
}
