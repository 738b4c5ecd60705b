import { Op } from 'sequelize';
import { Session } from '#api/db/models/session.ts';
import { inTransaction } from '#api/db/transaction.ts';

/** Ends every session of a user, but the one given; in force with the next request each makes. */
export async function endSessionsOf(userId: string, keep?: string): Promise<number> {
  return inTransaction(() =>
    Session.destroy({
      where: { userId, ...(keep === undefined ? {} : { sid: { [Op.ne]: keep } }) },
    }),
  );
}

/** Ends one of a user's own sessions; false where it is not theirs or not there. */
export async function endOwnSession(userId: string, rowId: string): Promise<boolean> {
  const ended = await inTransaction(() => Session.destroy({ where: { userId, sid: rowId } }));
  return ended === 1;
}
