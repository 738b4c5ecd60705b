import * as z from 'zod/mini';
import {
  eggPlan,
  eggsQuery,
  kitchenSheet,
  orderCost,
  shopping,
  shoppingQuery,
} from '#shared/contracts/kitchen-sheet.ts';
import { createRoutes } from '#api/http/route.ts';
import type { FeatureRoutes } from '#api/http/route.ts';
import { authorise } from '#api/modules/authorise.ts';
import type { Deps } from '#api/modules/deps.ts';
import { findOrderByNumber } from '#api/modules/orders/orders.queries.ts';
import { orderNumber } from '#api/http/order-number.ts';
import { presentEggPlan } from './egg-plan.presenter.ts';
import { planEggsOfSpan } from './egg-plan.queries.ts';
import { presentKitchenSheet } from './kitchen-sheet.presenter.ts';
import { mayKitchen } from './kitchen.policy.ts';
import { presentOrderCost } from './order-cost.presenter.ts';
import { costOfOrder } from './order-cost.queries.ts';
import { needsOfOrder } from './order-needs.queries.ts';
import { presentShopping } from './shopping.presenter.ts';
import { shoppingOfSpan } from './shopping.queries.ts';

const params = z.object({ number: orderNumber });

/** What goes into orders: formulas to the gram, eggs, shopping, and what it costs. */
export function kitchenRoutes(_deps: Deps): FeatureRoutes {
  const routes = createRoutes();

  routes.add(
    {
      name: 'see-kitchen-sheet',
      method: 'get',
      path: '/api/staff/orders/:number/kitchen',
      summary: 'What goes into an order, formula by formula, to the gram.',
      params,
      response: kitchenSheet,
      refusals: ['not-found'],
    },
    async ({ actor, params: { number } }) => {
      authorise(actor, mayKitchen(actor, 'see-kitchen-sheet'));
      const needs = await needsOfOrder(await findOrderByNumber(Number(number)));
      return presentKitchenSheet(needs, needs.index);
    },
  );

  routes.add(
    {
      name: 'see-order-cost',
      method: 'get',
      path: '/api/staff/orders/:number/cost',
      summary: 'What an order costs to make, what it leaves, and what would make it pay.',
      params,
      response: orderCost,
      refusals: ['not-found'],
    },
    async ({ actor, params: { number } }) => {
      authorise(actor, mayKitchen(actor, 'see-order-cost'));
      return presentOrderCost(await costOfOrder(await findOrderByNumber(Number(number))));
    },
  );

  routes.add(
    {
      name: 'plan-eggs',
      method: 'get',
      path: '/api/staff/eggs',
      summary: 'Which eggs to crack on which day for all that is made in a span, and what is left.',
      query: eggsQuery,
      response: eggPlan,
    },
    async ({ actor, query }) => {
      authorise(actor, mayKitchen(actor, 'plan-eggs'));
      return presentEggPlan(await planEggsOfSpan(query));
    },
  );

  routes.add(
    {
      name: 'plan-shopping',
      method: 'get',
      path: '/api/staff/shopping',
      summary: 'What to buy for all that is made in a span, in whole packs.',
      query: shoppingQuery,
      response: shopping,
    },
    async ({ actor, query }) => {
      authorise(actor, mayKitchen(actor, 'plan-shopping'));
      return presentShopping(await shoppingOfSpan(query));
    },
  );
  return routes;
}
