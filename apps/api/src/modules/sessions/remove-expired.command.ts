import { Op } from 'sequelize';
import { IdempotencyKey } from '#api/db/models/idempotency-key.ts';
import { SentMail } from '#api/db/models/sent-mail.ts';
import { Session } from '#api/db/models/session.ts';
import { SignInFailure } from '#api/db/models/sign-in-failure.ts';
import { Token } from '#api/db/models/token.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';

const dayMs = 86_400_000;

/**
 * Removes what has run out and is looked at no more: sessions, idempotency keys, tries of
 * yesterday, and links a month old that no kept e-mail belongs to. Run by the worker.
 */
export async function removeExpired({ clock }: Pick<Deps, 'clock'>): Promise<void> {
  const now = clock.now();
  const over = { [Op.lte]: now };
  const before = (days: number) => ({ [Op.lt]: new Date(now.getTime() - days * dayMs) });
  await inTransaction(async () => {
    await Session.destroy({
      where: { [Op.or]: [{ expires: over }, { absoluteExpiresAt: over }] },
    });
    await IdempotencyKey.destroy({ where: { expiresAt: over } });
    await SignInFailure.destroy({ where: { at: before(1) } });
    const old = await Token.findAll({ where: { expiresAt: before(30) } });
    const mailed = await SentMail.findAll({ where: { tokenId: old.map(({ id }) => id) } });
    const kept = new Set(mailed.map(({ tokenId }) => tokenId));
    await Token.destroy({
      where: { id: old.flatMap(({ id }) => (kept.has(id) ? [] : [id])) },
    });
  });
}
