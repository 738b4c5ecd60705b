import {
  linkLook,
  lookAtLink,
  requestPasswordReset as requestPasswordResetBody,
  requestSignInLink as requestSignInLinkBody,
  resetPassword as resetPasswordBody,
  spendLink as spendLinkBody,
  spentLink,
  type SpentLink,
} from '#shared/contracts/accounts.ts';
import { done, itIsDone } from '#shared/contracts/common.ts';
import { limitByAddress, limitByEmail } from '#api/http/rate-limit.ts';
import { createRoutes, type FeatureRoutes } from '#api/http/route.ts';
import { endSession, startSession } from '#api/http/session.ts';
import { confirmAction } from '#api/modules/accounts/confirm-action.command.ts';
import type { Deps } from '#api/modules/deps.ts';
import { findLink } from './links.queries.ts';
import { requestPasswordReset } from './request-password-reset.command.ts';
import { requestSignInLink } from './request-sign-in-link.command.ts';
import { resetPassword } from './reset-password.command.ts';
import { safeNext } from './safe-next.ts';
import { sessionViewOf } from './session-view.queries.ts';
import { signInWithLink } from './sign-in-with-link.command.ts';

/** One-time links: asking for one, looking at one, and spending it by a button's press. */
export function linksRoutes(deps: Deps): FeatureRoutes {
  const routes = createRoutes();
  const asking = [
    limitByAddress(deps, 'request-link'),
    limitByEmail(deps, 'request-link-to'),
  ] as const;
  const spending = limitByAddress(deps, 'spend-link');

  routes.add(
    {
      name: 'request-sign-in-link',
      method: 'post',
      path: '/api/session/links',
      summary: 'Have a sign-in link sent; the answer is the same for any address.',
      body: requestSignInLinkBody,
      response: done,
    },
    async ({ body }) => {
      const next = body.next === undefined ? null : safeNext(body.next);
      await requestSignInLink(deps, { email: body.email, next });
      return itIsDone;
    },
    ...asking,
  );

  routes.add(
    {
      name: 'look-at-link',
      method: 'post',
      path: '/api/session/links/look',
      summary: 'What a link is for, without spending it.',
      body: lookAtLink,
      response: linkLook,
      refusals: ['link-spent'],
    },
    async ({ body }) => {
      const { purpose, email, role, data } = await findLink(deps, body.token);
      return { purpose, email, role, name: typeof data['name'] === 'string' ? data['name'] : null };
    },
    spending,
  );

  routes.add(
    {
      name: 'spend-link',
      method: 'post',
      path: '/api/session/links/use',
      summary: 'Sign in with a link, or confirm what it asks about.',
      body: spendLinkBody,
      response: spentLink,
      refusals: ['link-spent', 'sign-in-failed', 'wrong-state'],
    },
    async ({ body, request }) => {
      const link = await findLink(deps, body.token);
      if (link.purpose === 'confirm-action') {
        await confirmAction(deps, body.token);
        await endSession(request);
        const session = await sessionViewOf(deps, { userId: undefined, secondFactor: undefined });
        const confirmed: SpentLink = { purpose: 'confirm-action', session, next: null };
        return confirmed;
      }
      const { user, next } = await signInWithLink(deps, body.token);
      await startSession(request, { userId: user.id, staff: false, secondFactor: 'none' });
      const session = await sessionViewOf(deps, { userId: user.id, secondFactor: 'none' });
      const signedIn: SpentLink = { purpose: 'sign-in', session, next };
      return signedIn;
    },
    spending,
  );

  routes.add(
    {
      name: 'request-password-reset',
      method: 'post',
      path: '/api/session/password-resets',
      summary: 'Have a link to a new password sent; the answer is the same for any address.',
      body: requestPasswordResetBody,
      response: done,
    },
    async ({ body }) => {
      await requestPasswordReset(deps, body.email);
      return itIsDone;
    },
    ...asking,
  );

  routes.add(
    {
      name: 'reset-password',
      method: 'post',
      path: '/api/session/password-resets/use',
      summary: 'Set a new password with a link; every session ends, the second factor stays.',
      body: resetPasswordBody,
      response: done,
      refusals: ['link-spent'],
    },
    async ({ body }) => {
      await resetPassword(deps, body);
      return itIsDone;
    },
    spending,
  );

  return routes;
}
