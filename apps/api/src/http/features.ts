import { estimatesRoutes } from '#api/modules/estimates/estimates.routes.ts';
import { ordersRoutes } from '#api/modules/orders/orders.routes.ts';
import { photosRoutes } from '#api/modules/photos/photos.routes.ts';
import { kitchenRulesRoutes } from '#api/modules/kitchen-rules/kitchen-rules.routes.ts';
import { allergyTableRoutes } from '#api/modules/allergy-table/allergy-table.routes.ts';
import { accountsRoutes } from '#api/modules/accounts/accounts.routes.ts';
import { datesRoutes } from '#api/modules/dates/dates.routes.ts';
import type { Deps } from '#api/modules/deps.ts';
import { healthRoutes } from '#api/modules/health/health.routes.ts';
import { cardsRoutes, careRoutes } from '#api/modules/cards/cards.routes.ts';
import { kitchenRoutes } from '#api/modules/kitchen/kitchen.routes.ts';
import { menuRoutes } from '#api/modules/menu/menu.routes.ts';
import { peopleRoutes } from '#api/modules/people/people.routes.ts';
import { pricesRoutes } from '#api/modules/prices/prices.routes.ts';
import { googleRoutes } from '#api/modules/sessions/google.routes.ts';
import { linksRoutes } from '#api/modules/sessions/links.routes.ts';
import { orderAccessRoutes } from '#api/modules/sessions/order-access.routes.ts';
import { secondFactorRoutes } from '#api/modules/sessions/second-factor.routes.ts';
import { pantryRoutes } from '#api/modules/pantry/pantry.routes.ts';
import { staffContentsRoutes } from '#api/modules/staff-orders/staff-contents.routes.ts';
import { staffMailRoutes } from '#api/modules/staff-orders/staff-mail.routes.ts';
import { staffMovesRoutes } from '#api/modules/staff-orders/staff-moves.routes.ts';
import { staffOrdersRoutes } from '#api/modules/staff-orders/staff-orders.routes.ts';
import { calendarRoutes } from '#api/modules/calendar/calendar.routes.ts';
import { sessionsRoutes } from '#api/modules/sessions/sessions.routes.ts';
import type { FeatureRoutes } from './route.ts';

/** Every feature's routes, in the order the API page lists them. */
export function featureRoutes(deps: Deps): readonly FeatureRoutes[] {
  return [
    menuRoutes(deps),
    estimatesRoutes(deps),
    photosRoutes(deps),
    ordersRoutes(deps),
    staffOrdersRoutes(deps),
    staffMovesRoutes(deps),
    staffMailRoutes(deps),
    staffContentsRoutes(deps),
    pantryRoutes(deps),
    kitchenRoutes(deps),
    cardsRoutes(deps),
    careRoutes(deps),
    calendarRoutes(deps),
    datesRoutes(deps),
    sessionsRoutes(deps),
    linksRoutes(deps),
    googleRoutes(deps),
    secondFactorRoutes(deps),
    orderAccessRoutes(deps),
    accountsRoutes(deps),
    peopleRoutes(deps),
    allergyTableRoutes(deps),
    kitchenRulesRoutes(deps),
    pricesRoutes(deps),
    healthRoutes(deps),
  ];
}
