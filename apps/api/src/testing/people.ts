import { Studio } from '#api/db/models/studio.ts';
import { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { deriveKey } from '#api/platform/ids.ts';
import { hashPassword } from '#api/platform/passwords.ts';
import type { Role } from '#shared/contracts/vocabulary.ts';
import type { TestApp } from './test-app.ts';
import type { TestClient } from './test-client.ts';
import { Token, type TokenPurpose } from '#api/db/models/token.ts';

/** The password of every member of staff that tests make. */
export const staffPassword = 'seven spoons of lemon curd';
let staffPasswordHash: Promise<string> | null = null;

/** An account; staff get `staffPassword`. */
export async function addUser(
  role: Role,
  given: { readonly email?: string; readonly name?: string } = {},
): Promise<User> {
  staffPasswordHash ??= hashPassword(staffPassword);
  const passwordHash = role === 'customer' ? null : await staffPasswordHash;
  return inTransaction(() =>
    User.create({
      email: given.email ?? `${role}@example.com`,
      name: given.name ?? `Some ${role}`,
      role,
      passwordHash,
    }),
  );
}

/** Turns the studio's demand for a second factor on or off. */
export async function setSecondFactorRequired(required: boolean): Promise<void> {
  await inTransaction(() => Studio.update({ requireSecondFactor: required }, { where: { id: 1 } }));
}

/** A browser in which a member of staff has signed in by password. */
export async function signInStaff(app: TestApp, user: User): Promise<TestClient> {
  const client = app.visitor();
  const answer = await client.post('/api/session/password', {
    email: user.email,
    password: staffPassword,
  });
  if (answer.status !== 200) throw new Error(`could not sign in: ${answer.text}`);
  return client;
}

/** A browser in which a customer has signed in by a link. */
export async function signInCustomer(app: TestApp, email: string): Promise<TestClient> {
  const client = app.visitor();
  await client.post('/api/session/links', { email });
  const answer = await client.post('/api/session/links/use', {
    token: await lastLinkKey(app, 'sign-in', email),
  });
  if (answer.status !== 200) throw new Error(`could not sign in: ${answer.text}`);
  return client;
}

/** The key in the last link of a purpose sent to an address, as the e-mail would have it. */
export async function lastLinkKey(
  app: TestApp,
  purpose: TokenPurpose,
  email: string | null,
): Promise<string> {
  const token = await Token.findOne({
    where: { purpose, email },
    order: [
      ['createdAt', 'DESC'],
      ['id', 'DESC'],
    ],
  });
  if (token === null) throw new Error(`no ${purpose} link was sent to ${email}`);
  return deriveKey(app.env.sessionSecret, purpose, token.id);
}
