import * as z from 'zod/mini';
import { id } from '#shared/contracts/common.ts';
import { acknowledgeContents, tellContents } from '#shared/contracts/contents.ts';
import { staffOrder } from '#shared/contracts/staff.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import type { Order } from '#api/db/models/order.ts';
import { createRoutes } from '#api/http/route.ts';
import type { FeatureRoutes } from '#api/http/route.ts';
import {
  acknowledgeContents as acknowledgeContentsCommand,
  tellContents as tellContentsCommand,
} from '#api/modules/contents/acknowledge-contents.command.ts';
import type { Deps } from '#api/modules/deps.ts';
import { findOrderByNumber } from '#api/modules/orders/orders.queries.ts';
import type { Staff } from '#api/platform/actor.ts';
import { authoriseStaff } from './authorise-staff.ts';
import { orderNumber } from '#api/http/order-number.ts';
import { loadStaffOrderPage } from './staff-order.queries.ts';
import { presentStaffOrder } from './staff-orders.presenter.ts';

const params = z.object({ number: orderNumber, id });

/** What staff do about an order that contains something else than its customer was told. */
export function staffContentsRoutes(deps: Deps): FeatureRoutes {
  const routes = createRoutes();

  routes.add(
    {
      name: 'acknowledge-contents',
      method: 'post',
      path: '/api/staff/orders/:number/contents/:id/acknowledge',
      summary: 'See to what has changed in it; say what is done where guests told something.',
      params,
      body: acknowledgeContents,
      response: staffOrder,
      refusals: ['not-found', 'wrong-state', 'changed-meanwhile'],
    },
    async ({ actor, params: { number, id: changeId }, body }) => {
      const staff = authoriseStaff(actor, 'acknowledge-contents');
      const order = await findOrderByNumber(Number(number));
      await acknowledgeContentsCommand(deps, { order, changeId, actor: staff, ...body });
      return show(order, staff);
    },
  );

  routes.add(
    {
      name: 'tell-contents',
      method: 'post',
      path: '/api/staff/orders/:number/contents/:id/told',
      summary: 'Note that the customer was told otherwise than by e-mail.',
      params,
      body: tellContents,
      response: staffOrder,
      refusals: ['not-found', 'wrong-state', 'changed-meanwhile'],
    },
    async ({ actor, params: { number, id: changeId }, body }) => {
      const staff = authoriseStaff(actor, 'tell-contents');
      const order = await findOrderByNumber(Number(number));
      await tellContentsCommand(deps, { order, changeId, actor: staff, ...body });
      return show(order, staff);
    },
  );
  return routes;
}

async function show(order: Order, actor: Staff): Promise<StaffOrder> {
  return presentStaffOrder(await loadStaffOrderPage(await order.reload()), actor);
}
