import { Op } from 'sequelize';
import { SignInFailure } from '#api/db/models/sign-in-failure.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { AppError } from '#api/platform/app-error.ts';
import { hashKey } from '#api/platform/ids.ts';

const windowMs = 15 * 60_000;

/**
 * Wrong tries within a quarter of an hour. Few from one place at one account; more in all, so
 * that nobody elsewhere can lock a person out by guessing, and none can guess for long.
 */
export const attemptLimits = { ofAccountAtAddress: 10, ofAccount: 50, ofAddress: 50 } as const;

export type Attempt = {
  /** What is being guessed at: `password:<address>`, `second-factor:<user>`. */
  readonly account: string;
  /** The network the request came from. */
  readonly address: string;
};

/**
 * Counts a try before it is looked at, so that a thousand at once are not a thousand free ones;
 * `forgiveAttempts` takes them back when one succeeds. Throws `too-many-requests`.
 */
export async function countAttempt(
  { clock }: Pick<Deps, 'clock'>,
  attempt: Attempt,
): Promise<void> {
  // Kept without the address a person wrote, which may be nobody's or somebody's elsewhere.
  const account = hashKey(attempt.account);
  const { address } = attempt;
  const since = { [Op.gt]: new Date(clock.now().getTime() - windowMs) };
  await inTransaction(async () => {
    const recent = await SignInFailure.findAll({
      where: { at: since, [Op.or]: [{ account }, { address }] },
      order: [['at', 'ASC']],
    });
    const groups = [
      {
        limit: attemptLimits.ofAccountAtAddress,
        rows: recent.filter((row) => row.account === account && row.address === address),
      },
      {
        limit: attemptLimits.ofAccount,
        rows: recent.filter((row) => row.account === account),
      },
      {
        limit: attemptLimits.ofAddress,
        rows: recent.filter((row) => row.address === address),
      },
    ];
    for (const { limit, rows } of groups) {
      // The one whose passing out of the window makes room again.
      const oldest = rows[rows.length - limit];
      if (oldest === undefined) continue;
      const freeAt = oldest.at.getTime() + windowMs;
      throw new AppError('too-many-requests', {
        retryAfterS: Math.ceil((freeAt - clock.now().getTime()) / 1000),
      });
    }
    await SignInFailure.create({ account, address, at: clock.now() });
  });
}

/** Takes back what was counted against an account at a place; a try has just succeeded there. */
export async function forgiveAttempts(attempt: Attempt): Promise<void> {
  await inTransaction(() =>
    SignInFailure.destroy({
      where: { account: hashKey(attempt.account), address: attempt.address },
    }),
  );
}
