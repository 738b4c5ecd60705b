import { Op } from 'sequelize';
import { Authenticator } from '#api/db/models/authenticator.ts';
import { Session } from '#api/db/models/session.ts';
import { Token } from '#api/db/models/token.ts';
import { User } from '#api/db/models/user.ts';
import type { Deps } from '#api/modules/deps.ts';
import { notFound } from '#api/platform/app-error.ts';
import { type StaffRole, staffRoles } from '#shared/contracts/vocabulary.ts';

/** A member of staff, or somebody invited who has not come yet. */
export type StaffRecord = {
  /** The user's id, or the invitation's. */
  readonly id: string;
  readonly userId: string | null;
  readonly name: string;
  readonly email: string;
  readonly role: StaffRole;
  readonly state: 'active' | 'invited' | 'ended';
  readonly secondFactor: boolean;
  readonly lastSeenAt: Date | null;
};

/** Everybody who works here, worked here, or is invited; by name. */
export async function listPeople({ clock }: Pick<Deps, 'clock'>): Promise<StaffRecord[]> {
  const users = await User.findAll({ where: { role: [...staffRoles] } });
  const userId = users.map(({ id }) => id);
  const authenticators = await Authenticator.findAll({
    where: { userId, confirmedAt: { [Op.ne]: null } },
  });
  const sessions = await Session.findAll({ where: { userId } });
  const staff = users.flatMap((user) => {
    const seen = sessions.filter((each) => each.userId === user.id).map((each) => each.lastSeenAt);
    return toRecord(user, {
      secondFactor: authenticators.some((each) => each.userId === user.id),
      lastSeenAt: latest([user.lastSignedInAt, ...seen]),
    });
  });
  const invitations = await Token.findAll({
    where: { purpose: 'invitation', usedAt: null, expiresAt: { [Op.gt]: clock.now() } },
  });
  return [...staff, ...invitations.flatMap(invitedRecord)].sort((one, other) =>
    one.name.localeCompare(other.name),
  );
}

/** One member of staff or standing invitation; throws `not-found`. */
export async function findStaffRecord(deps: Pick<Deps, 'clock'>, id: string): Promise<StaffRecord> {
  const found = (await listPeople(deps)).find((record) => record.id === id);
  if (found === undefined) throw notFound();
  return found;
}

function isStaffRole(role: string | null): role is StaffRole {
  return staffRoles.some((each) => each === role);
}

function toRecord(
  user: User,
  facts: Pick<StaffRecord, 'secondFactor' | 'lastSeenAt'>,
): StaffRecord[] {
  if (!isStaffRole(user.role)) return [];
  const state = user.endedAt === null ? 'active' : 'ended';
  const { id, name, role } = user;
  return [{ id, userId: id, name, email: user.email ?? '', role, state, ...facts }];
}

function invitedRecord(token: Token): StaffRecord[] {
  if (!isStaffRole(token.role)) return [];
  return [
    {
      id: token.id,
      userId: null,
      name: typeof token.data.name === 'string' ? token.data.name : '',
      email: token.email ?? '',
      role: token.role,
      state: 'invited',
      secondFactor: false,
      lastSeenAt: null,
    },
  ];
}

function latest(instants: readonly (Date | null)[]): Date | null {
  return instants.reduce(
    (last, each) => (each !== null && (last === null || each > last) ? each : last),
    null,
  );
}
