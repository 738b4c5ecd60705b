import { Op } from 'sequelize';
import { toString as qrCode } from 'qrcode';
import { Authenticator } from '#api/db/models/authenticator.ts';
import { RecoveryCode } from '#api/db/models/recovery-code.ts';
import { Studio } from '#api/db/models/studio.ts';
import type { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import { AppError, invalidField } from '#api/platform/app-error.ts';
import { hashKey } from '#api/platform/ids.ts';
import { countAttempt, forgiveAttempts } from './attempts.ts';
import { matchingStep, newRecoveryCodes, newTotpSecret, totpUri } from './one-time-codes.ts';
import { openSecret, sealSecret } from './sealed-secret.ts';
import { findAuthenticator } from './second-factor-state.queries.ts';

export type Enrolment = { readonly secret: string; readonly uri: string; readonly qrSvg: string };

/**
 * Begins enrolling: a new secret, good for nothing until a code of it is confirmed. One begun
 * before is dropped. Throws `wrong-state` where there is a working one already.
 */
export async function enrolSecondFactor(
  { env }: Pick<Deps, 'env'>,
  user: User,
): Promise<Enrolment> {
  const secret = newTotpSecret();
  const studio = await Studio.findOne();
  await inTransaction(async () => {
    if ((await findAuthenticator(user.id)) !== null) {
      throw new AppError('wrong-state', { detail: 'You have a second factor; remove it first.' });
    }
    await Authenticator.destroy({ where: { userId: user.id, confirmedAt: null } });
    await Authenticator.create({
      userId: user.id,
      kind: 'totp',
      secretEncrypted: sealSecret(env.sessionSecret, user.id, secret),
    });
  });
  const uri = totpUri(secret, user.email ?? user.name, studio?.name ?? 'Tierwell');
  return { secret, uri, qrSvg: await qrCode(uri, { type: 'svg', margin: 2 }) };
}

/**
 * Puts the begun second factor into force with a first code from it.
 * @returns the recovery codes, shown this once; only their hashes are kept
 */
export async function confirmSecondFactor(
  { env, clock }: Pick<Deps, 'env' | 'clock'>,
  user: User,
  given: { readonly code: string; readonly address: string },
): Promise<string[]> {
  const attempt = { account: `second-factor:${user.id}`, address: given.address };
  await countAttempt({ clock }, attempt);
  const codes = newRecoveryCodes();
  await inTransaction(async () => {
    const begun = await Authenticator.findOne({
      where: {
        userId: user.id,
        kind: 'totp',
        confirmedAt: null,
        secretEncrypted: { [Op.ne]: null },
      },
    });
    if (begun === null || begun.secretEncrypted === null) {
      throw new AppError('wrong-state', { detail: 'Begin with the picture to scan.' });
    }
    const secret = openSecret(env.sessionSecret, user.id, begun.secretEncrypted);
    const step = matchingStep(secret, given.code, clock.now());
    if (step === null) throw invalidField(['code'], 'That code does not match; try the next one.');
    await begun.update({ confirmedAt: clock.now(), lastStep: step, lastUsedAt: clock.now() });
    await RecoveryCode.destroy({ where: { userId: user.id } });
    await RecoveryCode.bulkCreate(
      codes.map((code) => ({ userId: user.id, hash: hashKey(`${user.id}:${code}`) })),
    );
    await forgiveAttempts(attempt);
    await noteAudit('system', {
      action: 'enrol-second-factor',
      subjectKind: 'user',
      subjectId: user.id,
    });
  });
  return codes;
}
