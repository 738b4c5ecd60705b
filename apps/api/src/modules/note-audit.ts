import { Audit } from '#api/db/models/audit.ts';
import type { IdFacts } from '#api/db/json-shapes.ts';
import { type Actor, roleOf, userIdOf } from '#api/platform/actor.ts';

export type AuditNote = {
  /** The command's verb: `change-role`. */
  readonly action: string;
  readonly subjectKind: string;
  readonly subjectId: string;
  /** Ids, codes and counts; never names, addresses or free text. */
  readonly data?: IdFacts;
};

/** Notes who did what to whom, for good; in the transaction of the deed. */
export async function noteAudit(actor: Actor | 'system', note: AuditNote): Promise<void> {
  await Audit.create({
    ...note,
    data: note.data ?? {},
    actorKind: actor === 'system' ? 'system' : auditKind(actor),
    actorUserId: actor === 'system' ? null : userIdOf(actor),
  });
}

/** A visitor who proves something by a link has no account yet: noted as a guest. */
function auditKind(actor: Actor): 'guest' | 'customer' | 'counter' | 'baker' | 'owner' {
  const role = roleOf(actor);
  return role === 'visitor' ? 'guest' : role;
}
