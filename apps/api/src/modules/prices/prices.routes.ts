import {
  pricesView,
  savePrices as savePricesBody,
  type PricesView,
} from '#shared/contracts/prices.ts';
import { createRoutes, type FeatureRoutes } from '#api/http/route.ts';
import { authorise, requireStaff } from '#api/modules/authorise.ts';
import type { Deps } from '#api/modules/deps.ts';
import { mayPrices } from './prices.policy.ts';
import { presentPrices } from './prices.presenter.ts';
import { findNewestBook, findPriceable, isCurrencyFixed, listBooks } from './prices.queries.ts';
import { savePrices } from './save-prices.command.ts';

/** The studio's price book: read it, write the next version of it. */
export function pricesRoutes(deps: Deps): FeatureRoutes {
  const routes = createRoutes();

  const everything = async (): Promise<PricesView> => {
    const [book, priceable, currencyFixed, books] = await Promise.all([
      findNewestBook(),
      findPriceable(),
      isCurrencyFixed(),
      listBooks(),
    ]);
    return presentPrices({ book, priceable, currencyFixed, books });
  };

  routes.add(
    {
      name: 'see-prices',
      method: 'get',
      path: '/api/staff/prices',
      summary: 'The price book in force, what it prices, and the books before it.',
      response: pricesView,
    },
    async ({ actor }) => {
      authorise(actor, mayPrices(actor, 'see-prices'));
      return everything();
    },
  );

  routes.add(
    {
      name: 'save-prices',
      method: 'put',
      path: '/api/staff/prices',
      summary: 'Write the next version of the price book.',
      body: savePricesBody,
      response: pricesView,
      refusals: ['changed-meanwhile'],
    },
    async ({ actor, body }) => {
      authorise(actor, mayPrices(actor, 'save-prices'));
      await savePrices(deps, requireStaff(actor), body);
      return everything();
    },
  );

  return routes;
}
