import * as z from 'zod/mini';
import { id } from '#shared/contracts/common.ts';
import {
  createFormula as createFormulaBody,
  formula,
  ingredient,
  pantry,
  savedFormula,
  savedIngredient,
  saveFormula as saveFormulaBody,
  saveIngredient as saveIngredientBody,
} from '#shared/contracts/pantry.ts';
import { createRoutes } from '#api/http/route.ts';
import type { FeatureRoutes } from '#api/http/route.ts';
import { authorise, requireStaff } from '#api/modules/authorise.ts';
import type { Deps } from '#api/modules/deps.ts';
import type { Actor, Staff } from '#api/platform/actor.ts';
import { archiveFormula, restoreFormula } from './archive-formula.command.ts';
import { archiveIngredient, restoreIngredient } from './archive-ingredient.command.ts';
import { createFormula } from './create-formula.command.ts';
import { currentPantry } from './load-pantry.queries.ts';
import { mayPantry } from './pantry.policy.ts';
import type { PantryAction } from './pantry.policy.ts';
import { saveFormula } from './save-formula.command.ts';
import { createIngredient, saveIngredient } from './save-ingredient.command.ts';

const params = z.object({ id });

/** Formulas and ingredients: what is in what, what it costs, what its label says. */
export function pantryRoutes(deps: Deps): FeatureRoutes {
  const routes = createRoutes();

  const staff = (actor: Actor, action: PantryAction): Staff => {
    authorise(actor, mayPantry(actor, action));
    return requireStaff(actor);
  };

  routes.add(
    {
      name: 'load-pantry',
      method: 'get',
      path: '/api/pantry',
      summary: 'Every ingredient, formula and version there is.',
      response: pantry,
    },
    async ({ actor }) => {
      staff(actor, 'see');
      const can = { save: mayPantry(actor, 'save'), seeCost: mayPantry(actor, 'see') };
      return { ...(await currentPantry()), can };
    },
  );

  routes.add(
    {
      name: 'create-formula',
      method: 'post',
      path: '/api/pantry/formulas',
      summary: 'A formula and its first version.',
      body: createFormulaBody,
      response: savedFormula,
      status: 201,
    },
    async ({ actor, body }) => createFormula(staff(actor, 'save'), body),
  );

  routes.add(
    {
      name: 'save-formula',
      method: 'post',
      path: '/api/pantry/formulas/:id/versions',
      summary: 'The next version of a formula; the earlier ones stay as they are.',
      params,
      body: saveFormulaBody,
      response: savedFormula,
      status: 201,
      refusals: ['not-found', 'changed-meanwhile'],
    },
    async ({ actor, params, body }) => saveFormula(deps, staff(actor, 'save'), params.id, body),
  );

  routes.add(
    {
      name: 'archive-formula',
      method: 'post',
      path: '/api/pantry/formulas/:id/archive',
      summary: 'Put a formula away that nothing on the menu is made with.',
      params,
      response: formula,
      refusals: ['not-found', 'still-used'],
    },
    async ({ actor, params }) => archiveFormula(deps, staff(actor, 'save'), params.id),
  );

  routes.add(
    {
      name: 'restore-formula',
      method: 'post',
      path: '/api/pantry/formulas/:id/restore',
      summary: 'Bring a formula back into use.',
      params,
      response: formula,
      refusals: ['not-found'],
    },
    async ({ actor, params }) => restoreFormula(staff(actor, 'save'), params.id),
  );

  routes.add(
    {
      name: 'create-ingredient',
      method: 'post',
      path: '/api/pantry/ingredients',
      summary: 'A product that is bought from now on.',
      body: saveIngredientBody,
      response: savedIngredient,
      status: 201,
    },
    async ({ actor, body }) => createIngredient(deps, staff(actor, 'save'), body),
  );

  routes.add(
    {
      name: 'save-ingredient',
      method: 'put',
      path: '/api/pantry/ingredients/:id',
      summary: 'Change a product; open orders are derived again where its label changed.',
      params,
      body: saveIngredientBody,
      response: savedIngredient,
      refusals: ['not-found', 'changed-meanwhile'],
    },
    async ({ actor, params, body }) => saveIngredient(deps, staff(actor, 'save'), params.id, body),
  );

  routes.add(
    {
      name: 'archive-ingredient',
      method: 'post',
      path: '/api/pantry/ingredients/:id/archive',
      summary: 'Put an ingredient away that no formula in use holds.',
      params,
      response: ingredient,
      refusals: ['not-found', 'still-used'],
    },
    async ({ actor, params }) => archiveIngredient(deps, staff(actor, 'save'), params.id),
  );

  routes.add(
    {
      name: 'restore-ingredient',
      method: 'post',
      path: '/api/pantry/ingredients/:id/restore',
      summary: 'Bring an ingredient back onto the shelf.',
      params,
      response: ingredient,
      refusals: ['not-found'],
    },
    async ({ actor, params }) => restoreIngredient(staff(actor, 'save'), params.id),
  );
  return routes;
}
