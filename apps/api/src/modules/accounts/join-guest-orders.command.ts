import { Op } from 'sequelize';
import { OrderContact } from '#api/db/models/order-contact.ts';
import { Order } from '#api/db/models/order.ts';
import type { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';

/**
 * Gives an account the orders that were sent from its address as a guest; called whenever the
 * address has just been proven. An order that is somebody's stays theirs.
 * @returns how many joined
 */
export async function joinGuestOrders(user: Pick<User, 'id' | 'email' | 'name'>): Promise<number> {
  const { id, email } = user;
  if (email === null) return 0;
  return inTransaction(async () => {
    const contacts = await OrderContact.findAll({ where: { role: 'ordered', email } });
    if (contacts.length === 0) return 0;
    const [joined] = await Order.update(
      { customerUserId: id },
      {
        where: { id: { [Op.in]: contacts.map(({ orderId }) => orderId) }, customerUserId: null },
      },
    );
    return joined;
  });
}
