import { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { spendLink } from '#api/modules/sessions/spend-link.command.ts';
import { AppError } from '#api/platform/app-error.ts';
import { eraseAccount } from './erase-account.command.ts';

/** Spends a confirming link and does what it was about. Throws `link-spent`, `wrong-state`. */
export async function confirmAction(deps: Pick<Deps, 'clock'>, key: string): Promise<void> {
  await inTransaction(async () => {
    const token = await spendLink(deps, key, ['confirm-action']);
    const user = token.userId === null ? null : await User.findByPk(token.userId);
    if (user === null || token.data.action !== 'erase-account') throw new AppError('link-spent');
    await eraseAccount(deps, user);
  });
}
