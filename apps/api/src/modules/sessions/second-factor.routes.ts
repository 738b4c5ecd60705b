import type { Request } from 'express';
import {
  recoveryCodes,
  secondFactorCode,
  secondFactorEnrolment,
  sessionView,
} from '#shared/contracts/accounts.ts';
import type { User } from '#api/db/models/user.ts';
import { accountOf } from '#api/http/authenticate.ts';
import { networkOf } from '#api/http/rate-limit.ts';
import { createRoutes, type FeatureRoutes } from '#api/http/route.ts';
import { startSession } from '#api/http/session.ts';
import type { SecondFactorState } from '#api/http/session-data.ts';
import type { Deps } from '#api/modules/deps.ts';
import { AppError } from '#api/platform/app-error.ts';
import { confirmSecondFactor, enrolSecondFactor } from './enrol-second-factor.command.ts';
import { passSecondFactor, removeSecondFactor } from './pass-second-factor.command.ts';
import { sessionViewOf } from './session-view.queries.ts';

/**
 * The member of staff a session belongs to, if its second factor is in one of these states: these
 * routes are for people who are not quite signed in yet, whom policies know as visitors.
 */
async function staffWith(request: Request, states: readonly SecondFactorState[]): Promise<User> {
  const user = await accountOf(request);
  if (user === null) throw new AppError('not-signed-in');
  if (user.role === 'customer') throw new AppError('not-allowed');
  const state = request.session.secondFactor ?? 'none';
  if (states.includes(state)) return user;
  throw new AppError(state === 'needed' ? 'second-factor-needed' : 'wrong-state', {
    detail: state === 'needed' ? undefined : 'No code is needed just now.',
  });
}

/** Staff's second factor: the code at sign-in, enrolling one, taking it off. */
export function secondFactorRoutes(deps: Deps): FeatureRoutes {
  const routes = createRoutes();
  const renew = async (request: Request, user: User, secondFactor: SecondFactorState) => {
    await startSession(request, { userId: user.id, staff: true, secondFactor });
  };

  routes.add(
    {
      name: 'pass-second-factor',
      method: 'post',
      path: '/api/session/second-factor',
      summary: 'The code of the second factor at sign-in, or a recovery code.',
      body: secondFactorCode,
      response: sessionView,
      refusals: ['wrong-state', 'not-signed-in'],
    },
    async ({ body, request }) => {
      const user = await staffWith(request, ['needed']);
      await passSecondFactor(deps, user, { ...body, address: networkOf(request) });
      await renew(request, user, 'done');
      return sessionViewOf(deps, { userId: user.id, secondFactor: 'done' });
    },
  );

  routes.add(
    {
      name: 'enrol-second-factor',
      method: 'post',
      path: '/api/session/second-factor/enrolment',
      summary: 'Begin a second factor: the secret to scan.',
      response: secondFactorEnrolment,
      refusals: ['wrong-state', 'not-signed-in', 'second-factor-needed'],
    },
    async ({ request }) => {
      const user = await staffWith(request, ['none', 'to-enrol', 'done']);
      return enrolSecondFactor(deps, user);
    },
  );

  routes.add(
    {
      name: 'confirm-second-factor',
      method: 'post',
      path: '/api/session/second-factor/enrolment/confirm',
      summary: 'Put it into force with a first code; answers the recovery codes, once.',
      body: secondFactorCode,
      response: recoveryCodes,
      refusals: ['wrong-state', 'not-signed-in', 'second-factor-needed'],
    },
    async ({ body, request }) => {
      const user = await staffWith(request, ['none', 'to-enrol', 'done']);
      const given = { ...body, address: networkOf(request) };
      const codes = await confirmSecondFactor(deps, user, given);
      await renew(request, user, 'done');
      return { codes };
    },
  );

  routes.add(
    {
      name: 'remove-second-factor',
      method: 'post',
      path: '/api/session/second-factor/removal',
      summary: 'Take the second factor off, with a code of it; not where the studio requires one.',
      body: secondFactorCode,
      response: sessionView,
      refusals: ['wrong-state', 'not-signed-in', 'second-factor-needed', 'not-allowed'],
    },
    async ({ body, request }) => {
      const user = await staffWith(request, ['none', 'done']);
      await removeSecondFactor(deps, user, { ...body, address: networkOf(request) });
      await renew(request, user, 'none');
      return sessionViewOf(deps, { userId: user.id, secondFactor: 'none' });
    },
  );

  return routes;
}
