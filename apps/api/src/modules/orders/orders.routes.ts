import * as z from 'zod/mini';

import {
  acceptLiftedStop,
  orderView,
  submitOrder,
  submittedOrder,
  withdrawOrder,
  writeMessage,
} from '#shared/contracts/orders.ts';
import { authorise, reveal } from '#api/modules/authorise.ts';
import type { Deps } from '#api/modules/deps.ts';
import { limitByAddress, networkOf } from '#api/http/rate-limit.ts';
import { createRoutes } from '#api/http/route.ts';
import type { FeatureRoutes } from '#api/http/route.ts';
import { grantOrder } from '#api/http/session.ts';
import { writeMessage as writeMessageCommand } from '#api/modules/messages/write-message.command.ts';
import type { Actor } from '#api/platform/actor.ts';
import type { Order } from '#api/db/models/order.ts';
import { acceptLiftedStop as acceptLiftedStopCommand } from './accept-lifted-stop.command.ts';
import { calendarFileOf } from './calendar-file.queries.ts';
import { loadOrderPage } from './order-page.queries.ts';
import { mayOrder, maySubmitOrder } from './orders.policy.ts';
import type { OrderAction } from './orders.policy.ts';
import { presentOrder } from './orders.presenter.ts';
import { findOrderByCode, resourceOf } from './orders.queries.ts';
import { submitOrder as submitOrderCommand } from './submit-order.command.ts';
import { withdrawOrder as withdrawOrderCommand } from './withdraw-order.command.ts';

const params = z.object({ code: z.string().check(z.maxLength(20)) });

/** What customers and guests do with their orders. */
export function ordersRoutes(deps: Deps): FeatureRoutes {
  const routes = createRoutes();

  routes.add(
    {
      name: 'submit-order',
      method: 'post',
      path: '/api/orders',
      summary: 'Send an order; the same Idempotency-Key twice is one order.',
      body: submitOrder,
      response: submittedOrder,
      status: 201,
      idempotent: true,
      refusals: [
        'price-changed',
        'date-gone',
        'too-many-holds',
        'key-reused',
        'not-allowed',
        'unavailable',
      ],
    },
    async ({ actor, body, idempotencyKey, request }) => {
      authorise(actor, maySubmitOrder(actor));
      const { order, answer } = await submitOrderCommand(deps, {
        form: body,
        idempotencyKey,
        actor,
        network: networkOf(request),
      });
      if (answer.key !== null) await grantOrder(request, order);
      return answer;
    },
    limitByAddress(deps, 'submit-order'),
  );

  routes.add(
    {
      name: 'see-order',
      method: 'get',
      path: '/api/orders/:code',
      summary: 'An order as its customer sees it.',
      params,
      response: orderView,
      refusals: ['not-found'],
    },
    async ({ actor, params: { code } }) => {
      const order = await findOwn(actor, code);
      return presentOrder(await loadOrderPage(order), actor);
    },
  );

  routes.add(
    {
      name: 'withdraw-order',
      method: 'post',
      path: '/api/orders/:code/withdraw',
      summary: 'Take an order back before it is confirmed.',
      params,
      body: withdrawOrder,
      response: orderView,
      refusals: ['not-found', 'wrong-state', 'changed-meanwhile', 'not-allowed'],
    },
    async ({ actor, params: { code }, body }) => {
      const order = await findOwn(actor, code);
      authoriseOn(actor, 'withdraw', order);
      await withdrawOrderCommand(deps, { order, actor, ...body });
      return presentOrder(await loadOrderPage(await order.reload()), actor);
    },
  );

  routes.add(
    {
      name: 'accept-lifted-stop',
      method: 'post',
      path: '/api/orders/:code/accept-lifted-stop',
      summary: 'Accept, having read it, why the studio takes the order against a stop.',
      params,
      body: acceptLiftedStop,
      response: orderView,
      refusals: ['not-found', 'wrong-state', 'changed-meanwhile', 'not-allowed'],
    },
    async ({ actor, params: { code }, body }) => {
      const order = await findOwn(actor, code);
      authoriseOn(actor, 'accept-lifted-stop', order);
      await acceptLiftedStopCommand(deps, { order, actor, ...body });
      return presentOrder(await loadOrderPage(await order.reload()), actor);
    },
  );

  routes.add(
    {
      name: 'write-message',
      method: 'post',
      path: '/api/orders/:code/messages',
      summary: 'Write to the studio about an order.',
      params,
      body: writeMessage,
      response: orderView,
      status: 201,
      refusals: ['not-found', 'not-allowed'],
    },
    async ({ actor, params: { code }, body }) => {
      const order = await findOwn(actor, code);
      authoriseOn(actor, 'write', order);
      await writeMessageCommand({ order, actor, body: body.body });
      return presentOrder(await loadOrderPage(order), actor);
    },
    limitByAddress(deps, 'write-message'),
  );

  routes.add(
    {
      name: 'see-calendar-file',
      method: 'get',
      path: '/api/orders/:code/calendar.ics',
      summary: 'The pickup of a confirmed order as an iCalendar file.',
      params,
      produces: 'text/calendar',
      refusals: ['not-found'],
    },
    async ({ actor, params: { code }, response }) => {
      const order = await findOwn(actor, code);
      reveal(mayOrder(actor, 'see-calendar-file', resourceOf(order)));
      response
        .set({
          'Cache-Control': 'private, no-store',
          'Content-Disposition': `attachment; filename="cake-${order.number}.ics"`,
        })
        .type('text/calendar; charset=utf-8')
        .send(await calendarFileOf(order.id, deps.env.publicUrl));
    },
  );

  return routes;
}

/** Somebody else's order is no order. */
async function findOwn(actor: Actor, code: string): Promise<Order> {
  const order = await findOrderByCode(code);
  reveal(mayOrder(actor, 'see', resourceOf(order)));
  return order;
}

function authoriseOn(actor: Actor, action: OrderAction, order: Order): void {
  authorise(actor, mayOrder(actor, action, resourceOf(order)));
}
