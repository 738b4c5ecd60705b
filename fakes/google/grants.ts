import { createHash, randomBytes, timingSafeEqual } from 'node:crypto';
import type { Person } from './people.ts';
import type { GoogleClient } from './wire.ts';

/** A code lives ten minutes, the longest RFC 6749 (4.1.2) recommends; a token an hour. */
const codeLifetimeMs = 10 * 60_000;
const tokenLifetimeMs = 3_599_000;

/** A checked authorization request, waiting for somebody to choose an account. */
export interface AuthorizationRequest {
  clientId: string;
  redirectUri: string;
  scope: string;
  state: string | undefined;
  codeChallenge: string | undefined;
}

export interface Identity {
  person: Person;
  emailVerified: boolean;
}

interface Code {
  request: AuthorizationRequest;
  identity: Identity;
  expiresAt: number;
  usable: boolean;
  spentOn: string | undefined;
}

/** The error codes of RFC 6749, section 5.2, with the sentence a developer reads. */
export interface TokenRefusal {
  error: 'invalid_client' | 'invalid_grant' | 'invalid_request' | 'unsupported_grant_type';
  description: string;
}

export interface Grants {
  /** Keeps a request while its page is open; answers the key the page carries. */
  hold(request: AuthorizationRequest): string;
  /** The held request, taken away: an account is chosen once. */
  release(key: string): AuthorizationRequest | undefined;
  /** A single-use code; one that is not `usable` is refused when it is redeemed. */
  issueCode(request: AuthorizationRequest, identity: Identity, usable: boolean): string;
  redeem(asked: {
    client: GoogleClient;
    code: string;
    redirectUri: string;
    verifier: string | undefined;
  }): { token: string; scope: string; email: string } | TokenRefusal;
  /** Whose token this is, while it lives. */
  identityOf(token: string): Identity | undefined;
}

function sameText(a: string, b: string): boolean {
  const [left, right] = [Buffer.from(a), Buffer.from(b)];
  return left.length === right.length && timingSafeEqual(left, right);
}

/** RFC 7636, section 4.6: BASE64URL(SHA256(verifier)) must equal the challenge. */
function verifierFits(challenge: string | undefined, verifier: string | undefined): boolean {
  if (challenge === undefined) return verifier === undefined;
  if (verifier === undefined) return false;
  return sameText(createHash('sha256').update(verifier).digest('base64url'), challenge);
}

const secret = (): string => randomBytes(24).toString('base64url');

function refused(description: string): TokenRefusal {
  return { error: 'invalid_grant', description };
}

/** Codes and tokens in memory; `now` decides what has run out. */
export function createGrants(now: () => Date): Grants {
  const held = new Map<string, AuthorizationRequest>();
  const codes = new Map<string, Code>();
  const tokens = new Map<string, { identity: Identity; expiresAt: number }>();

  return {
    hold(request) {
      const key = secret();
      held.set(key, request);
      return key;
    },

    release(key) {
      const request = held.get(key);
      held.delete(key);
      return request;
    },

    issueCode(request, identity, usable) {
      const code = `4/${secret()}`;
      const expiresAt = now().getTime() + codeLifetimeMs;
      codes.set(code, {
        request,
        identity,
        expiresAt,
        usable,
        spentOn: undefined,
      });
      return code;
    },

    redeem({ client, code, redirectUri, verifier }) {
      const grant = codes.get(code);
      if (grant === undefined || !grant.usable) return refused('The code is unknown.');
      if (grant.spentOn !== undefined) {
        // RFC 6749, 4.1.2: a code used twice may be stolen, so what it gave is taken back.
        tokens.delete(grant.spentOn);
        return refused('The code was used before.');
      }
      if (grant.expiresAt <= now().getTime()) return refused('The code has expired.');
      if (grant.request.clientId !== client.id) return refused('The code is another client’s.');
      if (grant.request.redirectUri !== redirectUri) {
        return refused('redirect_uri is not the one the code was asked with.');
      }
      if (!verifierFits(grant.request.codeChallenge, verifier)) {
        return refused('code_verifier does not match code_challenge.');
      }
      const token = `ya29.${secret()}`;
      grant.spentOn = token;
      tokens.set(token, {
        identity: grant.identity,
        expiresAt: now().getTime() + tokenLifetimeMs,
      });
      return {
        token,
        scope: grant.request.scope,
        email: grant.identity.person.email,
      };
    },

    identityOf(token) {
      const found = tokens.get(token);
      return found !== undefined && found.expiresAt > now().getTime() ? found.identity : undefined;
    },
  };
}

export const tokenLifetimeSeconds = tokenLifetimeMs / 1000;
