import { Identity } from '#api/db/models/identity.ts';
import { OrderRevision } from '#api/db/models/order-revision.ts';
import { Order } from '#api/db/models/order.ts';
import { User } from '#api/db/models/user.ts';
import { summariesOf } from '#api/modules/orders/order-summary.queries.ts';
import { notFound } from '#api/platform/app-error.ts';

export type AccountRecord = {
  readonly user: User;
  readonly google: boolean;
  readonly orders: readonly {
    readonly order: Order;
    readonly revision: OrderRevision;
    readonly summary: string;
  }[];
};

/** A customer's account with its orders, newest first; throws `not-found`. */
export async function loadAccount(userId: string): Promise<AccountRecord> {
  const user = await User.findByPk(userId);
  if (user === null) throw notFound();
  const orders = await Order.findAll({
    where: { customerUserId: userId },
    include: [{ model: OrderRevision, as: 'currentRevision' }],
    order: [['number', 'DESC']],
  });
  const summaries = await summariesOf(orders.map(({ id }) => id));
  return {
    user,
    google: (await Identity.count({ where: { userId } })) > 0,
    orders: orders.flatMap((order) => {
      const revision = order.currentRevision;
      if (revision === null || revision === undefined) return [];
      return [{ order, revision, summary: summaries.get(order.id) ?? '' }];
    }),
  };
}
