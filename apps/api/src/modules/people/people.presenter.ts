import type { StaffPeople } from '#shared/contracts/accounts.ts';
import type { Actor } from '#api/platform/actor.ts';
import { mayPeople } from './people.policy.ts';
import type { StaffRecord } from './people.queries.ts';

/** The people page, with what the reader may do about each. */
export function presentPeople(
  actor: Actor,
  people: readonly StaffRecord[],
  requireSecondFactor: boolean,
): StaffPeople {
  return {
    people: people.map((person) => ({
      id: person.id,
      name: person.name,
      email: person.email,
      role: person.role,
      state: person.state,
      secondFactor: person.secondFactor,
      lastSeenAt: person.lastSeenAt?.toISOString() ?? null,
      can: {
        end: mayPeople(actor, 'end-role', person),
        invite: mayPeople(actor, 'send-invitation-again', person),
        changeRole: mayPeople(actor, 'change-role', person),
      },
    })),
    requireSecondFactor,
    can: { invite: mayPeople(actor, 'invite-staff') },
  };
}
