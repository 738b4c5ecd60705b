import { Token, type TokenPurpose } from '#api/db/models/token.ts';
import type { IdFacts } from '#api/db/json-shapes.ts';
import type { Deps } from '#api/modules/deps.ts';
import { hashKey, newId } from '#api/platform/ids.ts';
import { keyOfLink } from '#api/platform/links.ts';
import type { Role } from '#shared/contracts/vocabulary.ts';

const minuteMs = 60_000;
const dayMs = 24 * 60 * minuteMs;

/** How long each kind of link may be used. */
const lifetimeMs: Readonly<Record<TokenPurpose, number>> = {
  'sign-in': 15 * minuteMs,
  'password-reset': 15 * minuteMs,
  'confirm-action': 15 * minuteMs,
  invitation: 7 * dayMs,
  'first-owner': 7 * dayMs,
};

export type LinkFor = {
  readonly purpose: TokenPurpose;
  readonly userId?: string | null;
  readonly email?: string | null;
  readonly role?: Role | null;
  readonly data?: IdFacts;
  readonly createdByUserId?: string | null;
};

/** Writes the row of a one-time link; in the transaction that also enqueues its e-mail. */
export async function issueLink(
  { clock, env }: Pick<Deps, 'clock' | 'env'>,
  link: LinkFor,
): Promise<Token> {
  const id = newId();
  return Token.create({
    id,
    hash: hashKey(keyOfLink(env.sessionSecret, { id, purpose: link.purpose })),
    purpose: link.purpose,
    userId: link.userId ?? null,
    email: link.email ?? null,
    role: link.role ?? null,
    data: link.data ?? {},
    createdByUserId: link.createdByUserId ?? null,
    expiresAt: new Date(clock.now().getTime() + lifetimeMs[link.purpose]),
  });
}
