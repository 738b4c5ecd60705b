import * as z from 'zod/mini';
import { writeMessage } from '#shared/contracts/orders.ts';
import {
  confirmationLook,
  confirmationQuery,
  listOrdersQuery,
  markOrder,
  orderList,
  staffOrder,
} from '#shared/contracts/staff.ts';
import { createRoutes } from '#api/http/route.ts';
import type { FeatureRoutes } from '#api/http/route.ts';
import type { Deps } from '#api/modules/deps.ts';
import { previewConfirmation } from '#api/modules/mail/confirmed-mail.queries.ts';
import { readMessages as readMessagesCommand } from '#api/modules/messages/read-messages.command.ts';
import { writeMessage as writeMessageCommand } from '#api/modules/messages/write-message.command.ts';
import { findOrderByNumber, loadCurrentRevision } from '#api/modules/orders/orders.queries.ts';
import { authoriseStaff } from './authorise-staff.ts';
import { blockersOf } from './blockers.queries.ts';
import { findOrders } from './list-orders.queries.ts';
import { loadOrderRows } from './order-cards.queries.ts';
import { orderNumber } from '#api/http/order-number.ts';
import { renewLink } from './renew-link.command.ts';
import { loadFit, loadStaffOrderPage } from './staff-order.queries.ts';
import { presentStaffOrder } from './staff-orders.presenter.ts';

const params = z.object({ number: orderNumber });

/** The staff's order book: finding, reading, writing to the customer. */
export function staffOrdersRoutes(deps: Deps): FeatureRoutes {
  const routes = createRoutes();

  routes.add(
    {
      name: 'list-orders',
      method: 'get',
      path: '/api/staff/orders',
      summary: 'Find, filter, sort and page the orders.',
      query: listOrdersQuery,
      response: orderList,
    },
    async ({ actor, query }) => {
      authoriseStaff(actor, 'see-orders');
      const { ids, ...found } = await findOrders(query);
      return { rows: await loadOrderRows(ids), ...found };
    },
  );

  routes.add(
    {
      name: 'see-staff-order',
      method: 'get',
      path: '/api/staff/orders/:number',
      summary: 'Everything about an order in one place.',
      params,
      response: staffOrder,
      refusals: ['not-found'],
    },
    async ({ actor, params: { number } }) => {
      authoriseStaff(actor, 'see-orders');
      const order = await findOrderByNumber(Number(number));
      return presentStaffOrder(await loadStaffOrderPage(order), actor);
    },
  );

  routes.add(
    {
      name: 'read-messages',
      method: 'post',
      path: '/api/staff/orders/:number/messages/read',
      summary: 'Note that the studio has opened what the customer wrote.',
      params,
      response: staffOrder,
      refusals: ['not-found'],
    },
    async ({ actor, params: { number } }) => {
      authoriseStaff(actor, 'see-orders');
      const order = await findOrderByNumber(Number(number));
      await readMessagesCommand(order.id);
      return presentStaffOrder(await loadStaffOrderPage(order), actor);
    },
  );

  routes.add(
    {
      name: 'look-at-confirmation',
      method: 'get',
      path: '/api/staff/orders/:number/confirmation',
      summary: 'A last look at price, e-mail, plan and what is open, before confirming.',
      params,
      query: confirmationQuery,
      response: confirmationLook,
      refusals: ['not-found'],
    },
    async ({ actor, params: { number }, query }) => {
      authoriseStaff(actor, 'confirm');
      const order = await findOrderByNumber(Number(number));
      const revision = await loadCurrentRevision(order);
      const [email, blockers, fits] = await Promise.all([
        previewConfirmation(deps, order.id, query.note ?? ''),
        blockersOf(revision),
        loadFit({ order, revision }),
      ]);
      const { rowVersion } = order;
      return { rowVersion, price: revision.estimate.price, email, blockers, fits };
    },
  );

  routes.add(
    {
      name: 'write-staff-message',
      method: 'post',
      path: '/api/staff/orders/:number/messages',
      summary: 'Write to the customer; they are told by e-mail.',
      params,
      body: writeMessage,
      response: staffOrder,
      status: 201,
      refusals: ['not-found'],
    },
    async ({ actor, params: { number }, body }) => {
      const staff = authoriseStaff(actor, 'write');
      const order = await findOrderByNumber(Number(number));
      await writeMessageCommand({ order, actor: staff, body: body.body });
      return presentStaffOrder(await loadStaffOrderPage(order), actor);
    },
  );

  routes.add(
    {
      name: 'renew-link',
      method: 'post',
      path: '/api/staff/orders/:number/link',
      summary: 'Make the order another private link and send it; the old one is dead.',
      params,
      body: markOrder,
      response: staffOrder,
      refusals: ['not-found', 'changed-meanwhile'],
    },
    async ({ actor, params: { number }, body }) => {
      const staff = authoriseStaff(actor, 'renew-link');
      const order = await findOrderByNumber(Number(number));
      await renewLink(deps, { order, actor: staff, ...body });
      return presentStaffOrder(await loadStaffOrderPage(await order.reload()), actor);
    },
  );
  return routes;
}
