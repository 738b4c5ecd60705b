import { Identity } from '#api/db/models/identity.ts';
import type { Token } from '#api/db/models/token.ts';
import { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import { endSessionsOf } from '#api/modules/sessions/end-sessions.command.ts';
import { hashNewPassword } from '#api/modules/sessions/hash-new-password.command.ts';
import { findLink } from '#api/modules/sessions/links.queries.ts';
import { spendLink } from '#api/modules/sessions/spend-link.command.ts';
import { AppError, invalidField } from '#api/platform/app-error.ts';
import type { AcceptInvitation } from '#shared/contracts/accounts.ts';
import type { Role } from '#shared/contracts/vocabulary.ts';

/**
 * Makes a member of staff of whoever holds the invitation, or the first owner. A customer's
 * account of the same address is taken over without the ways in it had. A refused password leaves
 * the link unspent. Throws `link-spent`, `invalid-input`.
 */
export async function acceptInvitation(
  deps: Pick<Deps, 'clock'>,
  given: AcceptInvitation,
): Promise<User> {
  const link = await findLink(deps, given.token);
  const email = addressOf(link, given);
  const { name } = given;
  const passwordHash = await hashNewPassword(given.password, { name, email });
  return inTransaction(async () => {
    const token = await spendLink(deps, given.token, ['invitation', 'first-owner']);
    const role = await roleOfLink(token);
    const user = await openStaffAccount(deps, { email, name, role, passwordHash });
    // The first owner's link was printed where the program runs, not sent to the address.
    if (token.purpose === 'invitation' && user.emailProvenAt === null) {
      await user.update({ emailProvenAt: deps.clock.now() });
    }
    await noteAudit('system', {
      action: 'accept-invitation',
      subjectKind: 'user',
      subjectId: user.id,
      data: { role, tokenId: token.id },
    });
    return user;
  });
}

function addressOf(link: Token, given: AcceptInvitation): string {
  if (link.purpose === 'invitation' && link.email !== null) return link.email;
  if (link.purpose !== 'first-owner') throw new AppError('link-spent');
  if (given.email !== undefined) return given.email;
  throw invalidField(['email'], 'We need an e-mail address.');
}

/** The first owner's link is void once there is an owner, however that came about. */
async function roleOfLink(token: Token): Promise<Exclude<Role, 'customer'>> {
  if (token.purpose === 'first-owner') {
    if ((await User.count({ where: { role: 'owner' } })) > 0) throw new AppError('link-spent');
    return 'owner';
  }
  if (token.role === null || token.role === 'customer') throw new AppError('link-spent');
  return token.role;
}

async function openStaffAccount(
  { clock }: Pick<Deps, 'clock'>,
  person: {
    readonly email: string;
    readonly name: string;
    readonly role: Role;
    readonly passwordHash: string;
  },
): Promise<User> {
  const found = await User.findOne({ where: { email: person.email } });
  if (found === null) return User.create({ ...person, lastSignedInAt: clock.now() });
  if (found.role !== 'customer' && found.endedAt === null) throw new AppError('link-spent');
  await endSessionsOf(found.id);
  await Identity.destroy({ where: { userId: found.id } });
  await found.update({ ...person, endedAt: null, lastSignedInAt: clock.now() });
  return found;
}
