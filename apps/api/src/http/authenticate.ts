import type { Request } from 'express';
import { User } from '#api/db/models/user.ts';
import { grantedOrders } from '#api/modules/orders/granted-orders.queries.ts';
import type { Actor } from '#api/platform/actor.ts';
import './session-data.ts';

const known = new WeakMap<Request, Promise<Actor>>();

/** Who asks, worked out once per request from its session and the account as it is now. */
export function actorOf(request: Request): Promise<Actor> {
  let actor = known.get(request);
  if (actor === undefined) {
    actor = findActor(request);
    known.set(request, actor);
  }
  return actor;
}

/** After signing in or out, or opening a private link, the request is somebody else's. */
export function forgetActor(request: Request): void {
  known.delete(request);
}

/** The account a request is signed in to, before any second factor; null for visitors. */
export async function accountOf(request: Request): Promise<User | null> {
  const { userId } = request.session;
  const user = userId === undefined ? null : await User.findByPk(userId);
  const stands = user !== null && user.endedAt === null && user.erasedAt === null;
  return stands ? user : null;
}

async function findActor(request: Request): Promise<Actor> {
  const { secondFactor, orders = [] } = request.session;
  const user = await accountOf(request);
  if (user === null || user.email === null) {
    const orderIds = await grantedOrders(orders);
    return orderIds.length === 0 ? { kind: 'visitor' } : { kind: 'guest', orderIds };
  }
  const { id, name, email, role } = user;
  if (role === 'customer') {
    return { kind: 'customer', userId: id, name, email, orderIds: await grantedOrders(orders) };
  }
  if (secondFactor === 'needed' || secondFactor === 'to-enrol') {
    return { kind: 'visitor', awaiting: 'second-factor' };
  }
  return { kind: 'staff', role, userId: id, name, email };
}
