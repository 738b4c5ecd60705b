import * as z from 'zod/mini';
import { datesResponse } from '#shared/contracts/dates.ts';
import {
  answerAllergy,
  calendarQuery,
  collectOrder,
  confirmOrder,
  declineOrder,
  liftStop,
  markOrder,
  moveOrder,
  recordTalk,
  staffOrder,
} from '#shared/contracts/staff.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import type { OrderRevision } from '#api/db/models/order-revision.ts';
import type { Order } from '#api/db/models/order.ts';
import { createRoutes } from '#api/http/route.ts';
import type { FeatureRoutes } from '#api/http/route.ts';
import type { Deps } from '#api/modules/deps.ts';
import { designOf } from '#api/modules/orders/order-design.queries.ts';
import { findOrderByNumber, loadCurrentRevision } from '#api/modules/orders/orders.queries.ts';
import { answerDatesToMove } from '#api/modules/plan/order-dates.queries.ts';
import type { Actor, Staff } from '#api/platform/actor.ts';
import type { ErrorCode } from '#shared/errors.ts';
import { answerAllergy as answerAllergyCommand } from './answer-allergy.command.ts';
import { authoriseStaff } from './authorise-staff.ts';
import { collectOrder as collectOrderCommand } from './collect-order.command.ts';
import { confirmOrder as confirmOrderCommand } from './confirm-order.command.ts';
import { declineOrder as declineOrderCommand } from './decline-order.command.ts';
import { liftStop as liftStopCommand } from './lift-stop.command.ts';
import { markOrder as markOrderCommand } from './mark-order.command.ts';
import { moveOrder as moveOrderCommand } from './move-order.command.ts';
import { orderNumber } from '#api/http/order-number.ts';
import { recordTalk as recordTalkCommand } from './record-talk.command.ts';
import { loadStaffOrderPage } from './staff-order.queries.ts';
import type { StaffOrderAction } from './staff-orders.policy.ts';
import { presentStaffOrder } from './staff-orders.presenter.ts';

type Moved = { readonly order: Order; readonly revision: OrderRevision; readonly actor: Staff };

const params = z.object({ number: orderNumber });
const ofAllergy = z.object({ number: orderNumber, id: z.string().check(z.maxLength(64)) });
const usual: readonly ErrorCode[] = ['not-found', 'wrong-state', 'changed-meanwhile'];

/** Every move the staff make with an order; each answers the order as it is after it. */
export function staffMovesRoutes(deps: Deps): FeatureRoutes {
  const routes = createRoutes();

  routes.add(
    {
      name: 'confirm-order',
      method: 'post',
      path: '/api/staff/orders/:number/confirm',
      summary: 'Take an unchanged offer in one press.',
      params,
      body: confirmOrder,
      response: staffOrder,
      refusals: [...usual, 'advice-stop', 'date-gone'],
    },
    async ({ actor, params, body }) => {
      const moved = await load(actor, 'confirm', params.number);
      const { rowVersion, note = '' } = body;
      await confirmOrderCommand(deps, { ...moved, rowVersion, note });
      return show(moved);
    },
  );

  routes.add(
    {
      name: 'decline-order',
      method: 'post',
      path: '/api/staff/orders/:number/decline',
      summary: 'Say no, with a reason and the nearest open days.',
      params,
      body: declineOrder,
      response: staffOrder,
      refusals: usual,
    },
    async ({ actor, params, body }) => {
      const moved = await load(actor, 'decline', params.number);
      await declineOrderCommand(deps, { ...moved, ...body });
      return show(moved);
    },
  );

  routes.add(
    {
      name: 'answer-dates-to-move',
      method: 'get',
      path: '/api/staff/orders/:number/dates',
      summary: 'The days it could move to, its own work set aside.',
      params,
      query: calendarQuery,
      response: datesResponse,
      refusals: ['not-found'],
    },
    async ({ actor, params, query }) => {
      const { order, revision } = await load(actor, 'move', params.number);
      const { id: orderId } = order;
      const design = designOf(revision);
      const { workTimeVersionId } = revision;
      return answerDatesToMove({ orderId, design, workTimeVersionId }, query.from, query.to);
    },
  );

  routes.add(
    {
      name: 'move-order',
      method: 'post',
      path: '/api/staff/orders/:number/move',
      summary: 'Give it another pickup; the customer is told.',
      params,
      body: moveOrder,
      response: staffOrder,
      refusals: [...usual, 'date-gone'],
    },
    async ({ actor, params, body }) => {
      const moved = await load(actor, 'move', params.number);
      const { rowVersion, note, date, windowStart } = body;
      await moveOrderCommand({ ...moved, rowVersion, note, pickup: { date, windowStart } });
      return show(moved);
    },
  );

  routes.add(
    {
      name: 'start-order',
      method: 'post',
      path: '/api/staff/orders/:number/start',
      summary: 'The making has begun.',
      params,
      body: markOrder,
      response: staffOrder,
      refusals: usual,
    },
    async ({ actor, params, body }) => {
      const moved = await load(actor, 'start', params.number);
      await markOrderCommand(deps, { ...moved, ...body, action: 'start' });
      return show(moved);
    },
  );

  routes.add(
    {
      name: 'mark-order-ready',
      method: 'post',
      path: '/api/staff/orders/:number/ready',
      summary: 'The cake is done; the customer is told.',
      params,
      body: markOrder,
      response: staffOrder,
      refusals: usual,
    },
    async ({ actor, params, body }) => {
      const moved = await load(actor, 'ready', params.number);
      await markOrderCommand(deps, { ...moved, ...body, action: 'ready' });
      return show(moved);
    },
  );

  routes.add(
    {
      name: 'collect-order',
      method: 'post',
      path: '/api/staff/orders/:number/collected',
      summary: 'Hand it over: to whom, in what condition, with a picture.',
      params,
      body: collectOrder,
      response: staffOrder,
      refusals: usual,
    },
    async ({ actor, params, body }) => {
      const moved = await load(actor, 'collect', params.number);
      await collectOrderCommand(deps, { ...moved, ...body });
      return show(moved);
    },
  );

  routes.add(
    {
      name: 'mark-order-uncollected',
      method: 'post',
      path: '/api/staff/orders/:number/uncollected',
      summary: 'Nobody came for it.',
      params,
      body: markOrder,
      response: staffOrder,
      refusals: usual,
    },
    async ({ actor, params, body }) => {
      const moved = await load(actor, 'uncollected', params.number);
      await markOrderCommand(deps, { ...moved, ...body, action: 'uncollected' });
      return show(moved);
    },
  );

  routes.add(
    {
      name: 'answer-allergy',
      method: 'post',
      path: '/api/staff/orders/:number/allergies/:id/answer',
      summary: 'Record the talk about an allergy at the table.',
      params: ofAllergy,
      body: answerAllergy,
      response: staffOrder,
      refusals: usual,
    },
    async ({ actor, params, body }) => {
      const moved = await load(actor, 'answer-allergy', params.number);
      await answerAllergyCommand(deps, { ...moved, ...body, allergyId: params.id });
      return show(moved);
    },
  );

  routes.add(
    {
      name: 'record-talk',
      method: 'post',
      path: '/api/staff/orders/:number/talks',
      summary: 'Record the talk about a stop that no declared allergy stands behind.',
      params,
      body: recordTalk,
      response: staffOrder,
      refusals: usual,
    },
    async ({ actor, params, body }) => {
      const moved = await load(actor, 'record-talk', params.number);
      await recordTalkCommand(deps, { ...moved, ...body });
      return show(moved);
    },
  );

  routes.add(
    {
      name: 'lift-stop',
      method: 'post',
      path: '/api/staff/orders/:number/lift-stop',
      summary: 'Take an order against a stop, with a written reason that stays.',
      params,
      body: liftStop,
      response: staffOrder,
      refusals: usual,
    },
    async ({ actor, params, body }) => {
      const moved = await load(actor, 'lift-stop', params.number);
      await liftStopCommand(deps, { ...moved, ...body });
      return show(moved);
    },
  );

  return routes;
}

/** Who may, on what there is. */
async function load(actor: Actor, action: StaffOrderAction, number: string): Promise<Moved> {
  const staff = authoriseStaff(actor, action);
  const order = await findOrderByNumber(Number(number));
  return { order, revision: await loadCurrentRevision(order), actor: staff };
}

async function show({ order, actor }: Moved): Promise<StaffOrder> {
  return presentStaffOrder(await loadStaffOrderPage(await order.reload()), actor);
}
