import { accountExport, accountView, eraseAccount } from '#shared/contracts/accounts.ts';
import { done, itIsDone } from '#shared/contracts/common.ts';
import { limitByAddress } from '#api/http/rate-limit.ts';
import { createRoutes, type FeatureRoutes } from '#api/http/route.ts';
import { authorise, requireCustomer } from '#api/modules/authorise.ts';
import type { Deps } from '#api/modules/deps.ts';
import { mayAccount } from './accounts.policy.ts';
import { presentAccount } from './accounts.presenter.ts';
import { loadAccount } from './accounts.queries.ts';
import { exportAccount } from './export-account.queries.ts';
import { requestErasure } from './request-erasure.command.ts';

/** A customer's account: their orders, everything to take away, and erasing it. */
export function accountsRoutes(deps: Deps): FeatureRoutes {
  const routes = createRoutes();

  routes.add(
    {
      name: 'see-account',
      method: 'get',
      path: '/api/account',
      summary: 'One’s own account with its orders, newest first.',
      response: accountView,
    },
    async ({ actor }) => {
      authorise(actor, mayAccount(actor, 'see-account'));
      return presentAccount(await loadAccount(requireCustomer(actor).userId));
    },
  );

  routes.add(
    {
      name: 'export-account',
      method: 'get',
      path: '/api/account/export',
      summary: 'Everything kept about oneself, as a file.',
      response: accountExport,
    },
    async ({ actor, response }) => {
      authorise(actor, mayAccount(actor, 'export-account'));
      response.attachment('my-orders.json');
      return exportAccount(requireCustomer(actor).userId);
    },
  );

  routes.add(
    {
      name: 'request-erasure',
      method: 'post',
      path: '/api/account/erasure',
      summary: 'Ask for everything about oneself to be erased; an e-mail asks once more.',
      body: eraseAccount,
      response: done,
      refusals: ['wrong-state'],
    },
    async ({ actor }) => {
      authorise(actor, mayAccount(actor, 'erase-account'));
      await requestErasure(deps, requireCustomer(actor));
      return itIsDone;
    },
    limitByAddress(deps, 'request-link'),
  );

  return routes;
}
