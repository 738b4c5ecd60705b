import { createHash } from 'node:crypto';
import type { LabelReason } from '#shared/contracts/cards.ts';
import type { Order } from '#api/db/models/order.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import type { Staff } from '#api/platform/actor.ts';
import { AppError } from '#api/platform/app-error.ts';

/** What the owner answered for, in short: another unknown is another fingerprint. */
export function fingerprintOf(reasons: readonly LabelReason[]): string {
  const sentences = confirmable(reasons).toSorted();
  return createHash('sha256').update(JSON.stringify(sentences)).digest('hex');
}

/** The sentences an owner may answer for. */
export function confirmable(reasons: readonly LabelReason[]): string[] {
  return reasons.filter((it) => it.confirmable).map((it) => it.sentence);
}

/**
 * The owner's word that what is not known may be printed as "not known". It holds for just what was
 * seen, and is noted for good.
 * @throws `changed-meanwhile` where something else is unknown by now
 */
export async function confirmUnknown(input: {
  readonly order: Order;
  readonly actor: Staff;
  readonly reasons: readonly LabelReason[];
  readonly seen: readonly string[];
}): Promise<void> {
  const { order, actor, reasons, seen } = input;
  const now = confirmable(reasons);
  if (now.length === 0 || now.toSorted().join('\n') !== seen.toSorted().join('\n')) {
    throw new AppError('changed-meanwhile', {
      detail: 'What is not known has changed. Read it again before you answer for it.',
    });
  }
  await inTransaction(async () => {
    await order.update({ unknownConfirmed: fingerprintOf(reasons) });
    await noteAudit(actor, {
      action: 'confirm-unknown',
      subjectKind: 'order',
      subjectId: order.id,
      data: { sentences: now.length },
    });
  });
}
