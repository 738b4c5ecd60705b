import type { Handler, Request, RequestHandler, Response } from 'express';
import passport from 'passport';
import * as z from 'zod/mini';
import {
  createGoogleStrategy,
  readGoogleProfile,
  type GoogleProfile,
} from '#api/clients/google.ts';
import { accountOf, actorOf } from '#api/http/authenticate.ts';
import { limitByAddress } from '#api/http/rate-limit.ts';
import { createRoutes, type FeatureRoutes } from '#api/http/route.ts';
import { saveSession, startSession } from '#api/http/session.ts';
import { authorise } from '#api/modules/authorise.ts';
import type { Deps } from '#api/modules/deps.ts';
import { notFound } from '#api/platform/app-error.ts';
import { safeNext } from './safe-next.ts';
import { secondFactorNeed } from './second-factor-state.queries.ts';
import { maySession } from './sessions.policy.ts';
import {
  type GoogleRefusal,
  type GoogleSignIn,
  linkGoogle,
  signInWithGoogle,
} from './sign-in-with-google.command.ts';

/** What the sign-in page says when this did not work out. */
type GoogleProblem = GoogleRefusal | 'google-denied' | 'google-failed';

/** Passport, which types leave open, as Express knows it. */
const authenticator: passport.Authenticator<Handler, RequestHandler> = passport;

const callbackPath = '/api/auth/google/callback';

/** Longest wait for Google, which a person spends before an empty page. */
const patienceMs = 10_000;

type Outcome = { readonly profile: GoogleProfile } | { readonly problem: GoogleProblem };

/**
 * Signing in with Google: out to its page and back. Every failure comes back to our own sign-in
 * page with a word for what happened.
 */
export function googleRoutes(deps: Deps): FeatureRoutes {
  const routes = createRoutes();
  const { env, logger } = deps;
  const strategy =
    env.google === null ? null : createGoogleStrategy(env.google, env.publicUrl + callbackPath);

  /** Runs the strategy on the way back; ends by itself when Google takes too long. */
  const finish = (request: Request, response: Response): Promise<Outcome> =>
    new Promise((resolve) => {
      if (strategy === null) throw notFound();
      const timer = setTimeout(() => resolve({ problem: 'google-failed' }), patienceMs);
      const settle = (error: unknown, told: unknown): void => {
        clearTimeout(timer);
        const profile = readGoogleProfile(told);
        if (profile !== null) return resolve({ profile });
        if (error !== null) logger.warn({ err: error }, 'signing in with Google failed');
        resolve({ problem: 'google-failed' });
      };
      void authenticator.authenticate(strategy, { session: false }, settle)(
        request,
        response,
        (error: unknown) => settle(error, null),
      );
    });

  routes.add(
    {
      name: 'begin-google',
      method: 'get',
      path: '/api/auth/google',
      summary: 'Go to Google to sign in, or to link it to the account signed in.',
      query: z.object({
        next: z.optional(z.string().check(z.maxLength(300))),
        link: z.optional(z.boolean()),
      }),
      produces: 'text/html',
    },
    async ({ actor, query, request, response }) => {
      if (strategy === null) throw notFound('Signing in with Google is not set up here.');
      const linking = query.link === true;
      if (linking) authorise(actor, maySession(actor, 'link-google'));
      request.session.google = {
        purpose: linking ? 'link' : 'sign-in',
        next: safeNext(query.next ?? '') ?? (linking ? '/account' : '/'),
      };
      await new Promise<void>((resolve, reject) => {
        response.once('finish', resolve).once('error', reject);
        void authenticator.authenticate(strategy, { session: false })(request, response, reject);
      });
    },
    limitByAddress(deps, 'google'),
  );

  routes.add(
    {
      name: 'finish-google',
      method: 'get',
      path: callbackPath,
      summary: 'Where Google sends people back to.',
      produces: 'text/html',
    },
    async ({ request, response }) => {
      const asked = request.session.google;
      const stop = (problem: GoogleProblem): void =>
        response.redirect(303, `/sign-in?problem=${problem}`);
      delete request.session.google;
      if (request.query.error === 'access_denied') return stop('google-denied');
      // Without a code the strategy would take the request for a beginning.
      if (asked === undefined || typeof request.query.code !== 'string') {
        return stop('google-failed');
      }
      const outcome = await finish(request, response);
      if ('problem' in outcome) return stop(outcome.problem);
      const result = await settleSignIn(request, asked.purpose, outcome.profile);
      if (result.refusal !== null) return stop(result.refusal);
      response.redirect(303, result.next ?? asked.next);
    },
    limitByAddress(deps, 'google'),
  );

  type Settled = { readonly refusal: GoogleRefusal | null; readonly next?: string };

  /** Links or signs in; where a second factor is due, the way goes past it. */
  async function settleSignIn(
    request: Request,
    purpose: 'sign-in' | 'link',
    profile: GoogleProfile,
  ): Promise<Settled> {
    if (purpose === 'link') {
      const linked = await linkCurrent(request, profile);
      await saveSession(request);
      return { refusal: linked.refusal };
    }
    const { user, refusal } = await signInWithGoogle(deps, profile);
    if (user === null) return { refusal };
    const staff = user.role !== 'customer';
    const secondFactor = await secondFactorNeed(user);
    await startSession(request, { userId: user.id, staff, secondFactor });
    return secondFactor === 'none'
      ? { refusal: null }
      : { refusal: null, next: '/sign-in/second-factor' };
  }

  async function linkCurrent(request: Request, profile: GoogleProfile): Promise<GoogleSignIn> {
    const actor = await actorOf(request);
    authorise(actor, maySession(actor, 'link-google'));
    const user = await accountOf(request);
    if (user === null) throw notFound();
    return linkGoogle(deps, user, profile);
  }

  return routes;
}
