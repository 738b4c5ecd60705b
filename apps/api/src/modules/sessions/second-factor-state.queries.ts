import { Op } from 'sequelize';
import { Authenticator } from '#api/db/models/authenticator.ts';
import { Studio } from '#api/db/models/studio.ts';
import type { User } from '#api/db/models/user.ts';

/** What still stands between a password and a member of staff's rights. */
export type SecondFactorNeed = 'none' | 'needed' | 'to-enrol';

/** A member of staff's second factor that works, or null. */
export function findAuthenticator(userId: string): Promise<Authenticator | null> {
  return Authenticator.findOne({
    where: { userId, kind: 'totp', confirmedAt: { [Op.ne]: null } },
  });
}

/** Whether the studio asks every member of staff for a second factor. */
export async function requiresSecondFactor(): Promise<boolean> {
  const studio = await Studio.findOne();
  return studio?.requireSecondFactor ?? true;
}

/** What signing in still needs: the second factor there is, or one where the studio wants it. */
export async function secondFactorNeed(user: Pick<User, 'id' | 'role'>): Promise<SecondFactorNeed> {
  if (user.role === 'customer') return 'none';
  if ((await findAuthenticator(user.id)) !== null) return 'needed';
  return (await requiresSecondFactor()) ? 'to-enrol' : 'none';
}
