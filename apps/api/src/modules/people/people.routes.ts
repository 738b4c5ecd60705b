import * as z from 'zod/mini';
import {
  acceptInvitation as acceptInvitationBody,
  changeRole as changeRoleBody,
  inviteStaff as inviteStaffBody,
  sessionView,
  staffPeople,
  type StaffPeople,
} from '#shared/contracts/accounts.ts';
import { id } from '#shared/contracts/common.ts';
import { limitByAddress } from '#api/http/rate-limit.ts';
import { createRoutes, type FeatureRoutes } from '#api/http/route.ts';
import { startSession } from '#api/http/session.ts';
import { authorise, requireStaff } from '#api/modules/authorise.ts';
import type { Deps } from '#api/modules/deps.ts';
import {
  requiresSecondFactor,
  secondFactorNeed,
} from '#api/modules/sessions/second-factor-state.queries.ts';
import { sessionViewOf } from '#api/modules/sessions/session-view.queries.ts';
import type { Staff } from '#api/platform/actor.ts';
import { acceptInvitation } from './accept-invitation.command.ts';
import { changeRole } from './change-role.command.ts';
import { endRole } from './end-role.command.ts';
import { inviteStaff } from './invite-staff.command.ts';
import { mayPeople } from './people.policy.ts';
import { presentPeople } from './people.presenter.ts';
import { findStaffRecord, listPeople } from './people.queries.ts';

const personId = z.object({ id });

/** Who works here: list, invite, change and end roles; and coming in by an invitation. */
export function peopleRoutes(deps: Deps): FeatureRoutes {
  const routes = createRoutes();

  const everybody = async (actor: Staff): Promise<StaffPeople> =>
    presentPeople(actor, await listPeople(deps), await requiresSecondFactor());

  routes.add(
    {
      name: 'list-people',
      method: 'get',
      path: '/api/staff/people',
      summary: 'Everybody who works here, worked here or is invited.',
      response: staffPeople,
    },
    async ({ actor }) => {
      authorise(actor, mayPeople(actor, 'list-people'));
      return everybody(requireStaff(actor));
    },
  );

  routes.add(
    {
      name: 'invite-staff',
      method: 'post',
      path: '/api/staff/people/invitations',
      summary: 'Invite somebody to work here, by e-mail.',
      body: inviteStaffBody,
      response: staffPeople,
    },
    async ({ actor, body }) => {
      authorise(actor, mayPeople(actor, 'invite-staff'));
      const staff = requireStaff(actor);
      await inviteStaff(deps, staff, body);
      return everybody(staff);
    },
  );

  routes.add(
    {
      name: 'send-invitation-again',
      method: 'post',
      path: '/api/staff/people/:id/invitation',
      summary: 'Send an invitation again; the earlier link stops working.',
      params: personId,
      response: staffPeople,
    },
    async ({ actor, params }) => {
      authorise(actor, mayPeople(actor, 'invite-staff'));
      const staff = requireStaff(actor);
      const person = await findStaffRecord(deps, params.id);
      authorise(actor, mayPeople(actor, 'send-invitation-again', person));
      await inviteStaff(deps, staff, person);
      return everybody(staff);
    },
  );

  routes.add(
    {
      name: 'change-role',
      method: 'put',
      path: '/api/staff/people/:id/role',
      summary: 'Give a member of staff another role; they sign in again.',
      params: personId,
      body: changeRoleBody,
      response: staffPeople,
      refusals: ['changed-meanwhile'],
    },
    async ({ actor, params, body }) => {
      authorise(actor, mayPeople(actor, 'list-people'));
      const staff = requireStaff(actor);
      const person = await findStaffRecord(deps, params.id);
      authorise(actor, mayPeople(actor, 'change-role', person));
      await changeRole(staff, person, body.role);
      return everybody(staff);
    },
  );

  routes.add(
    {
      name: 'end-role',
      method: 'delete',
      path: '/api/staff/people/:id',
      summary: 'End a role and its sessions, or withdraw an invitation.',
      params: personId,
      response: staffPeople,
      refusals: ['changed-meanwhile'],
    },
    async ({ actor, params }) => {
      authorise(actor, mayPeople(actor, 'list-people'));
      const staff = requireStaff(actor);
      const person = await findStaffRecord(deps, params.id);
      authorise(actor, mayPeople(actor, 'end-role', person));
      await endRole(deps, staff, person);
      return everybody(staff);
    },
  );

  routes.add(
    {
      name: 'accept-invitation',
      method: 'post',
      path: '/api/session/invitations/use',
      summary: 'Come to work here, by an invitation or the first owner’s link.',
      body: acceptInvitationBody,
      response: sessionView,
      refusals: ['link-spent'],
    },
    async ({ body, request }) => {
      const user = await acceptInvitation(deps, body);
      const secondFactor = await secondFactorNeed(user);
      await startSession(request, { userId: user.id, staff: true, secondFactor });
      return sessionViewOf(deps, { userId: user.id, secondFactor });
    },
    limitByAddress(deps, 'spend-link'),
  );

  return routes;
}
