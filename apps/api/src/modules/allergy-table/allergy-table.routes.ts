import {
  allergyTable,
  saveAllergyTable as saveAllergyTableBody,
} from '#shared/contracts/allergy-table.ts';
import { createRoutes } from '#api/http/route.ts';
import type { FeatureRoutes } from '#api/http/route.ts';
import { authorise, requireStaff } from '#api/modules/authorise.ts';
import type { Deps } from '#api/modules/deps.ts';
import { mayAllergyTable } from './allergy-table.policy.ts';
import { loadAllergyTable } from './allergy-table.queries.ts';
import { saveAllergyTable } from './save-allergy-table.command.ts';

/** What the owner takes, talks over and refuses, and says of the kitchen. */
export function allergyTableRoutes(_deps: Deps): FeatureRoutes {
  const routes = createRoutes();

  routes.add(
    {
      name: 'see-allergy-table',
      method: 'get',
      path: '/api/staff/allergy-table',
      summary: 'Take, talk or refuse by allergen and severity, and what the kitchen handles.',
      response: allergyTable,
    },
    ({ actor }) => {
      authorise(actor, mayAllergyTable(actor, 'see-allergy-table'));
      return loadAllergyTable();
    },
  );

  routes.add(
    {
      name: 'save-allergy-table',
      method: 'put',
      path: '/api/staff/allergy-table',
      summary: 'Put another table in its place; orders that wait are judged by it.',
      body: saveAllergyTableBody,
      response: allergyTable,
      refusals: ['changed-meanwhile'],
    },
    async ({ actor, body }) => {
      authorise(actor, mayAllergyTable(actor, 'save-allergy-table'));
      await saveAllergyTable(requireStaff(actor), body);
      return loadAllergyTable();
    },
  );

  return routes;
}
