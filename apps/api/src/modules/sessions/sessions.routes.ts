import * as z from 'zod/mini';
import {
  changePassword as changePasswordBody,
  ownSessions,
  sessionView,
  signInWithPassword as signInWithPasswordBody,
} from '#shared/contracts/accounts.ts';
import { done, id, itIsDone } from '#shared/contracts/common.ts';
import { networkOf } from '#api/http/rate-limit.ts';
import { createRoutes, type FeatureRoutes } from '#api/http/route.ts';
import { endSession, startSession } from '#api/http/session.ts';
import { sessionRowId } from '#api/http/session-store.ts';
import { authorise, requireSignedIn, requireStaff, reveal } from '#api/modules/authorise.ts';
import type { Deps } from '#api/modules/deps.ts';
import { changePassword } from './change-password.command.ts';
import { endOwnSession } from './end-sessions.command.ts';
import { secondFactorNeed } from './second-factor-state.queries.ts';
import { sessionViewOf } from './session-view.queries.ts';
import { maySession } from './sessions.policy.ts';
import { presentSessions } from './sessions.presenter.ts';
import { listSessions } from './sessions.queries.ts';
import { signInWithPassword } from './sign-in-with-password.command.ts';

/** Who is there, staff's password, and one's own sessions. */
export function sessionsRoutes(deps: Deps): FeatureRoutes {
  const routes = createRoutes();

  routes.add(
    {
      name: 'get-session',
      method: 'get',
      path: '/api/session',
      summary: 'Who is signed in here, if anybody.',
      response: sessionView,
    },
    ({ request }) => {
      const { userId, secondFactor } = request.session;
      return sessionViewOf(deps, { userId, secondFactor });
    },
  );

  routes.add(
    {
      name: 'sign-in-with-password',
      method: 'post',
      path: '/api/session/password',
      summary: 'Sign in as staff; a second factor may still be needed.',
      body: signInWithPasswordBody,
      response: sessionView,
      refusals: ['sign-in-failed'],
    },
    async ({ body, request }) => {
      const user = await signInWithPassword(deps, { ...body, address: networkOf(request) });
      const secondFactor = await secondFactorNeed(user);
      await startSession(request, { userId: user.id, staff: true, secondFactor });
      return sessionViewOf(deps, { userId: user.id, secondFactor });
    },
  );

  routes.add(
    {
      name: 'sign-out',
      method: 'delete',
      path: '/api/session',
      summary: 'End this session.',
      response: sessionView,
    },
    async ({ request }) => {
      await endSession(request);
      return sessionViewOf(deps, { userId: undefined, secondFactor: undefined });
    },
  );

  routes.add(
    {
      name: 'change-password',
      method: 'post',
      path: '/api/account/password',
      summary: 'Choose a new password; one’s other sessions end.',
      body: changePasswordBody,
      response: done,
    },
    async ({ actor, body, request }) => {
      authorise(actor, maySession(actor, 'change-password'));
      await changePassword(deps, {
        ...body,
        actor: requireStaff(actor),
        address: networkOf(request),
        keep: sessionRowId(request.sessionID),
      });
      return itIsDone;
    },
  );

  routes.add(
    {
      name: 'list-sessions',
      method: 'get',
      path: '/api/account/sessions',
      summary: 'Where one is signed in.',
      response: ownSessions,
    },
    async ({ actor, request }) => {
      authorise(actor, maySession(actor, 'list-sessions'));
      const sessions = await listSessions(deps, requireSignedIn(actor).userId);
      return presentSessions(sessions, sessionRowId(request.sessionID));
    },
  );

  routes.add(
    {
      name: 'end-session',
      method: 'delete',
      path: '/api/account/sessions/:id',
      summary: 'End one of one’s own sessions.',
      params: z.object({ id }),
      response: ownSessions,
    },
    async ({ actor, params, request }) => {
      authorise(actor, maySession(actor, 'end-session'));
      const { userId } = requireSignedIn(actor);
      reveal(await endOwnSession(userId, params.id));
      const current = sessionRowId(request.sessionID);
      if (params.id === current) await endSession(request);
      return presentSessions(await listSessions(deps, userId), current);
    },
  );

  return routes;
}
