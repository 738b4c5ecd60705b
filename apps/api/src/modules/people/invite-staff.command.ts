import { Op } from 'sequelize';
import { Token } from '#api/db/models/token.ts';
import { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import { issueLink } from '#api/modules/sessions/issue-link.command.ts';
import { enqueue } from '#api/outbox/enqueue.ts';
import type { Staff } from '#api/platform/actor.ts';
import { invalidField } from '#api/platform/app-error.ts';
import type { StaffRole } from '#shared/contracts/vocabulary.ts';

export type Invitation = {
  readonly email: string;
  readonly name: string;
  readonly role: StaffRole;
};

/**
 * Invites somebody to work here; the link in the e-mail proves the address. An invitation to the
 * same address that still stands is replaced. Refused for somebody who works here already.
 */
export async function inviteStaff(
  deps: Pick<Deps, 'clock' | 'env'>,
  actor: Staff,
  invitation: Invitation,
): Promise<void> {
  const { email, name, role } = invitation;
  await inTransaction(async () => {
    const user = await User.findOne({ where: { email } });
    if (user !== null && user.role !== 'customer' && user.endedAt === null) {
      throw invalidField(['email'], 'Somebody with this address works here already.');
    }
    await withdrawInvitationsTo(deps, email);
    const token = await issueLink(deps, {
      purpose: 'invitation',
      email,
      role,
      data: { name },
      createdByUserId: actor.userId,
    });
    await enqueue(
      'staff-invited',
      { tokenId: token.id },
      { uniqueKey: `staff-invited:${token.id}` },
    );
    await noteAudit(actor, {
      action: 'invite-staff',
      subjectKind: 'token',
      subjectId: token.id,
      data: { role },
    });
  });
}

/** Spends standing invitations to an address, so that only the last one sent works. */
async function withdrawInvitationsTo({ clock }: Pick<Deps, 'clock'>, email: string): Promise<void> {
  await Token.update(
    { usedAt: clock.now() },
    { where: { purpose: 'invitation', email, usedAt: { [Op.is]: null } } },
  );
}
