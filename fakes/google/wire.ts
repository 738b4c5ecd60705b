import * as z from 'zod/mini';

/**
 * Ways to fail, as the account chooser and the control client ask for them:
 * - `denied`: the person says no, or closes the page;
 * - `bad-code`: the code that comes back is refused at the token endpoint;
 * - `slow-token`: the token endpoint answers after `ms` milliseconds;
 * - `unverified-email`: the account's address is not verified;
 * - `token-error`, `userinfo-error`: that endpoint answers 503.
 */
export const googleFailure = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('denied') }),
  z.object({ kind: z.literal('bad-code') }),
  z.object({
    kind: z.literal('slow-token'),
    ms: z.int().check(z.minimum(0), z.maximum(120_000)),
  }),
  z.object({ kind: z.literal('unverified-email') }),
  z.object({ kind: z.literal('token-error') }),
  z.object({ kind: z.literal('userinfo-error') }),
]);
export type GoogleFailure = z.infer<typeof googleFailure>;

export const plannedGoogleFailure = z.object({
  failure: googleFailure,
  times: z.int().check(z.minimum(1)),
});

/** One request to the stand-in and its outcome. Codes, tokens and secrets are never written. */
export const googleCall = z.object({
  n: z.int(),
  at: z.string(),
  endpoint: z.enum(['authorize', 'choose', 'token', 'userinfo']),
  status: z.int(),
  outcome: z.string(),
  clientId: z.optional(z.string()),
  email: z.optional(z.string()),
});
export type GoogleCall = z.infer<typeof googleCall>;

/** An application registered with the stand-in; redirect addresses are compared exactly. */
export const googleClient = z.object({
  id: z.string().check(z.minLength(1)),
  secret: z.string().check(z.minLength(1)),
  redirectUris: z.array(z.url()),
});
export type GoogleClient = z.infer<typeof googleClient>;
