import { setTimeout as pause } from 'node:timers/promises';
import type { Request, Response } from 'express';
import express, { Router } from 'express';
import * as z from 'zod/mini';
import type { CallLog } from '#fakes/harness/call-log.ts';
import type { FailureQueue } from '#fakes/harness/failure-queue.ts';
import { chooserPage, refusalPage } from './chooser.ts';
import type { Grants } from './grants.ts';
import { tokenLifetimeSeconds } from './grants.ts';
import { personFor } from './people.ts';
import type { GoogleCall, GoogleClient, GoogleFailure } from './wire.ts';

type CallDetail = Omit<GoogleCall, 'n' | 'at'>;

export interface GoogleState {
  clients: Map<string, GoogleClient>;
  grants: Grants;
  failures: FailureQueue<GoogleFailure>;
  calls: CallLog<CallDetail>;
}

const authorizationQuery = z.object({
  client_id: z.string(),
  redirect_uri: z.string(),
  response_type: z.string(),
  scope: z.optional(z.string()),
  state: z.optional(z.string()),
  code_challenge: z.optional(z.string()),
  code_challenge_method: z.optional(z.string()),
});

const choiceBody = z.object({
  key: z.string(),
  outcome: z.optional(z.string()),
  email: z.optional(z.string()),
  otherEmail: z.optional(z.string()),
  otherName: z.optional(z.string()),
  other: z.optional(z.string()),
  deny: z.optional(z.string()),
});

const tokenBody = z.object({
  grant_type: z.optional(z.string()),
  code: z.optional(z.string()),
  redirect_uri: z.optional(z.string()),
  client_id: z.optional(z.string()),
  client_secret: z.optional(z.string()),
  code_verifier: z.optional(z.string()),
});

/** How long the chooser's "takes ten seconds" takes. */
const slowChoiceMs = 10_000;

const is =
  <Kind extends GoogleFailure['kind']>(kind: Kind) =>
  (failure: GoogleFailure): failure is Extract<GoogleFailure, { kind: Kind }> =>
    failure.kind === kind;

function returnAddress(redirectUri: string, fields: Record<string, string | undefined>): string {
  const address = new URL(redirectUri);
  for (const [name, value] of Object.entries(fields)) {
    if (value !== undefined) address.searchParams.set(name, value);
  }
  return address.href;
}

/** Client id and secret from the body, or from HTTP Basic (RFC 6749, section 2.3.1). */
function credentials(request: Request, body: z.infer<typeof tokenBody>): [string, string] {
  const [scheme, encoded = ''] = (request.headers.authorization ?? '').split(' ');
  if (scheme !== 'Basic') return [body.client_id ?? '', body.client_secret ?? ''];
  const [id = '', secret = ''] = Buffer.from(encoded, 'base64').toString().split(':');
  return [decodeURIComponent(id), decodeURIComponent(secret)];
}

/** The endpoints an application talks to, refusing what RFC 6749 and RFC 7636 refuse. */
export function createOauthRoutes({ clients, grants, failures, calls }: GoogleState): Router {
  const router = Router();
  const form = express.urlencoded({ extended: false });

  function refuse(response: Response, error: string, description: string, clientId?: string): void {
    calls.add({ endpoint: 'authorize', status: 400, outcome: error, clientId });
    response.status(400).send(refusalPage(error, description));
  }

  router.get('/o/oauth2/v2/auth', (request, response) => {
    const query = authorizationQuery.safeParse(request.query);
    if (!query.success) {
      refuse(response, 'invalid_request', 'client_id, redirect_uri or response_type is missing.');
      return;
    }
    const asked = query.data;
    const client = clients.get(asked.client_id);
    if (client === undefined) {
      refuse(response, 'invalid_client', 'The client is not known.', asked.client_id);
      return;
    }
    if (!client.redirectUris.includes(asked.redirect_uri)) {
      refuse(
        response,
        'redirect_uri_mismatch',
        `${asked.redirect_uri} is not a registered redirect address.`,
        client.id,
      );
      return;
    }

    // From here on the redirect address is trusted, so a wrong request is told to the application.
    const sendBack = (error: string) => {
      calls.add({
        endpoint: 'authorize',
        status: 302,
        outcome: error,
        clientId: client.id,
      });
      response.redirect(returnAddress(asked.redirect_uri, { error, state: asked.state }));
    };
    if (asked.response_type !== 'code') return sendBack('unsupported_response_type');
    if (asked.scope === undefined || asked.scope === '') return sendBack('invalid_scope');
    if (asked.code_challenge !== undefined && asked.code_challenge_method !== 'S256') {
      return sendBack('invalid_request');
    }
    if (failures.take(is('denied')) !== undefined) return sendBack('access_denied');

    const key = grants.hold({
      clientId: client.id,
      redirectUri: asked.redirect_uri,
      scope: asked.scope,
      state: asked.state,
      codeChallenge: asked.code_challenge,
    });
    calls.add({
      endpoint: 'authorize',
      status: 200,
      outcome: 'chooser',
      clientId: client.id,
    });
    response.send(chooserPage(key, new URL(asked.redirect_uri).host));
  });

  router.post('/o/oauth2/v2/auth/choose', form, (request, response) => {
    const body = choiceBody.safeParse(request.body);
    const held = body.success ? grants.release(body.data.key) : undefined;
    if (!body.success || held === undefined) {
      calls.add({
        endpoint: 'choose',
        status: 400,
        outcome: 'invalid_request',
      });
      response.status(400).send(refusalPage('invalid_request', 'This page was used before.'));
      return;
    }
    const choice = body.data;
    const { clientId } = held;
    const email = choice.other === undefined ? choice.email : choice.otherEmail?.trim();
    if (choice.deny !== undefined || email === undefined || email === '') {
      const error = 'access_denied';
      calls.add({ endpoint: 'choose', status: 303, outcome: error, clientId });
      response.redirect(303, returnAddress(held.redirectUri, { error, state: held.state }));
      return;
    }

    if (choice.outcome === 'slow-token') {
      failures.add({
        failure: { kind: 'slow-token', ms: slowChoiceMs },
        times: 1,
      });
    }
    if (choice.outcome === 'token-error') {
      failures.add({ failure: { kind: 'token-error' }, times: 1 });
    }
    const badCode = choice.outcome === 'bad-code' || failures.take(is('bad-code')) !== undefined;
    const unverified =
      choice.outcome === 'unverified-email' || failures.take(is('unverified-email')) !== undefined;
    const person = personFor(email, choice.otherName);
    const code = grants.issueCode(held, { person, emailVerified: !unverified }, !badCode);
    const outcome = badCode ? 'bad-code' : unverified ? 'unverified-email' : 'code';
    calls.add({ endpoint: 'choose', status: 303, outcome, clientId, email });
    response.redirect(
      303,
      returnAddress(held.redirectUri, {
        code,
        scope: held.scope,
        state: held.state,
      }),
    );
  });

  router.post('/token', form, async (request, response) => {
    response.set('Cache-Control', 'no-store');
    const body = tokenBody.parse(request.body ?? {});
    const [clientId, secret] = credentials(request, body);
    const answer = (status: number, outcome: string, fields: object, email?: string) => {
      calls.add({ endpoint: 'token', status, outcome, clientId, email });
      response.status(status).json(fields);
    };

    const slow = failures.take(is('slow-token'));
    if (slow !== undefined) await pause(slow.ms);
    if (failures.take(is('token-error')) !== undefined) {
      return answer(503, 'token-error', { error: 'temporarily_unavailable' });
    }

    const client = clients.get(clientId);
    if (client === undefined || client.secret !== secret) {
      return answer(401, 'invalid_client', {
        error: 'invalid_client',
        error_description: 'The client id or secret is wrong.',
      });
    }
    if (body.grant_type !== 'authorization_code') {
      return answer(400, 'unsupported_grant_type', {
        error: 'unsupported_grant_type',
        error_description: 'Only authorization_code is granted.',
      });
    }
    if (body.code === undefined || body.redirect_uri === undefined) {
      return answer(400, 'invalid_request', {
        error: 'invalid_request',
        error_description: 'code or redirect_uri is missing.',
      });
    }
    const result = grants.redeem({
      client,
      code: body.code,
      redirectUri: body.redirect_uri,
      verifier: body.code_verifier,
    });
    if ('error' in result) {
      return answer(400, result.error, {
        error: result.error,
        error_description: result.description,
      });
    }
    answer(
      200,
      'token',
      {
        access_token: result.token,
        expires_in: tokenLifetimeSeconds,
        scope: result.scope,
        token_type: 'Bearer',
      },
      result.email,
    );
  });

  router.get('/v3/userinfo', (request, response) => {
    if (failures.take(is('userinfo-error')) !== undefined) {
      calls.add({
        endpoint: 'userinfo',
        status: 503,
        outcome: 'userinfo-error',
      });
      response.status(503).json({ error: 'temporarily_unavailable' });
      return;
    }
    const [scheme, token = ''] = (request.headers.authorization ?? '').split(' ');
    const identity = scheme === 'Bearer' ? grants.identityOf(token) : undefined;
    if (identity === undefined) {
      calls.add({
        endpoint: 'userinfo',
        status: 401,
        outcome: 'invalid_request',
      });
      response.status(401).json({
        error: 'invalid_request',
        error_description: 'The access token is missing, unknown or expired.',
      });
      return;
    }
    const { person, emailVerified } = identity;
    calls.add({
      endpoint: 'userinfo',
      status: 200,
      outcome: 'profile',
      email: person.email,
    });
    response.json({
      sub: person.sub,
      name: `${person.givenName} ${person.familyName}`.trim(),
      given_name: person.givenName,
      family_name: person.familyName,
      email: person.email,
      email_verified: emailVerified,
    });
  });

  return router;
}
