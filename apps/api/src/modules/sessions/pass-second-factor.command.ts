import { Op, or } from 'sequelize';
import { changeOne } from '#api/db/change-one.ts';
import { Authenticator } from '#api/db/models/authenticator.ts';
import { RecoveryCode } from '#api/db/models/recovery-code.ts';
import type { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import { AppError, invalidField } from '#api/platform/app-error.ts';
import { hashKey } from '#api/platform/ids.ts';
import { countAttempt, forgiveAttempts } from './attempts.ts';
import { matchingStep, readRecoveryCode } from './one-time-codes.ts';
import { openSecret } from './sealed-secret.ts';
import { findAuthenticator, requiresSecondFactor } from './second-factor-state.queries.ts';

export type GivenCode = { readonly code: string; readonly address: string };

/**
 * Takes a code of the second factor, or a recovery code; each works once. Throws `invalid-input`
 * on a wrong one and `too-many-requests` after several.
 */
export async function passSecondFactor(
  { env, clock }: Pick<Deps, 'env' | 'clock'>,
  user: User,
  { code, address }: GivenCode,
): Promise<void> {
  const attempt = { account: `second-factor:${user.id}`, address };
  await countAttempt({ clock }, attempt);
  await inTransaction(async () => {
    const now = clock.now();
    const authenticator = await findAuthenticator(user.id);
    if (authenticator === null || authenticator.secretEncrypted === null) {
      throw new AppError('wrong-state', { detail: 'There is no second factor on this account.' });
    }
    const secret = openSecret(env.sessionSecret, user.id, authenticator.secretEncrypted);
    const step = matchingStep(secret, code.replaceAll(' ', ''), now);
    const passed =
      step === null
        ? await changeOne(
            RecoveryCode,
            { usedAt: now },
            {
              userId: user.id,
              hash: hashKey(`${user.id}:${readRecoveryCode(code)}`),
              usedAt: null,
            },
          )
        : await changeOne(
            Authenticator,
            { lastStep: step, lastUsedAt: now },
            { id: authenticator.id, lastStep: or(null, { [Op.lt]: step }) },
          );
    if (!passed) throw invalidField(['code'], 'That code does not match, or it has been used.');
    await forgiveAttempts(attempt);
  });
}

/** Takes the second factor off an account, with a code of it; not where the studio requires one. */
export async function removeSecondFactor(
  deps: Pick<Deps, 'env' | 'clock'>,
  user: User,
  given: GivenCode,
): Promise<void> {
  if (await requiresSecondFactor()) {
    throw new AppError('not-allowed', {
      detail: 'This studio asks everybody for a second factor.',
    });
  }
  await passSecondFactor(deps, user, given);
  await inTransaction(async () => {
    await Authenticator.destroy({ where: { userId: user.id } });
    await RecoveryCode.destroy({ where: { userId: user.id } });
    await noteAudit('system', {
      action: 'remove-second-factor',
      subjectKind: 'user',
      subjectId: user.id,
    });
  });
}
