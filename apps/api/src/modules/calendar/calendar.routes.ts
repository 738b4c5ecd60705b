import * as z from 'zod/mini';
import { done, itIsDone } from '#shared/contracts/common.ts';
import { blockDay, blockedDay, calendarQuery, calendarView } from '#shared/contracts/staff.ts';
import { createRoutes } from '#api/http/route.ts';
import type { FeatureRoutes } from '#api/http/route.ts';
import { authorise, requireStaff } from '#api/modules/authorise.ts';
import type { Deps } from '#api/modules/deps.ts';
import { blockDay as blockDayCommand } from '#api/modules/plan/block-day.command.ts';
import { openDay } from '#api/modules/plan/open-day.command.ts';
import { mayStaffDo } from '#api/modules/staff-orders/may-staff.queries.ts';
import { presentCalendar } from './calendar.presenter.ts';
import { loadCalendar } from './calendar.queries.ts';

/** The staff's days: what is on them, and closing one. */
export function calendarRoutes(_deps: Deps): FeatureRoutes {
  const routes = createRoutes();

  routes.add(
    {
      name: 'see-calendar',
      method: 'get',
      path: '/api/staff/calendar',
      summary: 'Days with their load, a lane per promised cake, and what waits for an answer.',
      query: calendarQuery,
      response: calendarView,
    },
    async ({ actor, query }) => {
      authorise(actor, mayStaffDo(actor, 'see-orders'));
      return presentCalendar(await loadCalendar(query.from, query.to), actor);
    },
  );

  routes.add(
    {
      name: 'block-day',
      method: 'post',
      path: '/api/staff/closures',
      summary: 'Close a day for work and pickups; what stands on it stays and is named.',
      body: blockDay,
      response: blockedDay,
      status: 201,
      refusals: ['wrong-state'],
    },
    async ({ actor, body }) => {
      authorise(actor, mayStaffDo(actor, 'block-days'));
      return blockDayCommand({ ...body, actor: requireStaff(actor) });
    },
  );

  routes.add(
    {
      name: 'open-day',
      method: 'delete',
      path: '/api/staff/closures/:id',
      summary: 'Open a closed day again.',
      params: z.object({ id: z.string().check(z.maxLength(64)) }),
      response: done,
      refusals: ['not-found'],
    },
    async ({ actor, params }) => {
      authorise(actor, mayStaffDo(actor, 'block-days'));
      await openDay({ ...params, actor: requireStaff(actor) });
      return itIsDone;
    },
  );
  return routes;
}
