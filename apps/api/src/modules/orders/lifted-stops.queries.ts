import type { StaffLiftedStop } from '#shared/contracts/staff.ts';
import { LiftedStop } from '#api/db/models/lifted-stop.ts';
import type { OrderRevision } from '#api/db/models/order-revision.ts';
import { User } from '#api/db/models/user.ts';
import { estimateNow } from '#api/modules/contents/content-changes.queries.ts';

/**
 * The stops of a revision that the owner takes the order against, oldest first, each with the
 * sentence it was told in and the reason. What was erased is left out.
 */
export async function liftedStopsOf(revision: OrderRevision): Promise<StaffLiftedStop[]> {
  const lifted = await LiftedStop.findAll({
    where: { revisionId: revision.id },
    order: [['liftedAt', 'ASC']],
  });
  if (lifted.length === 0) return [];
  const { advice } = await estimateNow(revision);
  const owners = await User.findAll({ where: { id: lifted.map((it) => it.liftedByUserId) } });
  const names = new Map(owners.map(({ id, name }) => [id, name]));
  return lifted
    .filter(({ about }) => !about.startsWith('erased:'))
    .map(({ id, code, about, reason, liftedByUserId, liftedAt, acceptedAt }) => {
      const stop = [...revision.estimate.advice, ...advice].find(
        (it) => it.code === code && it.about === about,
      );
      const sentence = stop?.sentence ?? '';
      return {
        id,
        code,
        about,
        sentence,
        plain: stop === undefined || stop.plain === '' ? sentence : stop.plain,
        reason,
        by: names.get(liftedByUserId) ?? '',
        at: liftedAt.toISOString(),
        acceptedAt: acceptedAt?.toISOString() ?? null,
      };
    });
}
