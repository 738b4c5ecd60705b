import { Op } from 'sequelize';
import { Session } from '#api/db/models/session.ts';
import type { Deps } from '#api/modules/deps.ts';

/** A user's sessions that still stand, latest used first. */
export function listSessions({ clock }: Pick<Deps, 'clock'>, userId: string): Promise<Session[]> {
  const now = clock.now();
  return Session.findAll({
    where: { userId, expires: { [Op.gt]: now }, absoluteExpiresAt: { [Op.gt]: now } },
    order: [['lastSeenAt', 'DESC']],
  });
}
