import { Op } from 'sequelize';
import { SentMail } from '#api/db/models/sent-mail.ts';
import { Session } from '#api/db/models/session.ts';
import { SignInFailure } from '#api/db/models/sign-in-failure.ts';
import { Token } from '#api/db/models/token.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';

const dayMs = 86_400_000;

/**
 * Removes what has run out: sessions, counted tries of yesterday, and links a month old whose
 * e-mail is not kept.
 */
export async function tidySignIn({ clock }: Pick<Deps, 'clock'>): Promise<void> {
  const now = clock.now();
  const before = (days: number) => ({ [Op.lt]: new Date(now.getTime() - days * dayMs) });
  await inTransaction(async () => {
    await Session.destroy({
      where: {
        [Op.or]: [{ expires: { [Op.lte]: now } }, { absoluteExpiresAt: { [Op.lte]: now } }],
      },
    });
    await SignInFailure.destroy({ where: { at: before(1) } });
    const old = await Token.findAll({ where: { expiresAt: before(30) } });
    const mailed = await SentMail.findAll({ where: { tokenId: old.map(({ id }) => id) } });
    const kept = new Set(mailed.map(({ tokenId }) => tokenId));
    await Token.destroy({
      where: { id: old.flatMap(({ id }) => (kept.has(id) ? [] : [id])) },
    });
  });
}
