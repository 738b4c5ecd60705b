import { DeclaredAllergy } from '#api/db/models/declared-allergy.ts';
import type { Order } from '#api/db/models/order.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteOrderEvent } from '#api/modules/orders/note-order-event.command.ts';
import { touchOrder } from '#api/modules/orders/touch-order.command.ts';
import type { Staff } from '#api/platform/actor.ts';
import { AppError, notFound } from '#api/platform/app-error.ts';

/**
 * Records a talk about one allergy at the table. It answers what was told in words; what the cake
 * contains stays what it is.
 * @throws `wrong-state` when it was answered already: what was settled stays
 */
export async function answerAllergy(
  { clock }: Pick<Deps, 'clock'>,
  input: {
    readonly order: Order;
    readonly allergyId: string;
    readonly actor: Staff;
    readonly rowVersion: number;
    readonly text: string;
  },
): Promise<void> {
  const { order, allergyId, actor, rowVersion, text } = input;
  await inTransaction(async () => {
    const declared = await DeclaredAllergy.findOne({
      where: { id: allergyId, revisionId: order.currentRevisionId ?? '', erasedAt: null },
    });
    if (declared === null) throw notFound();
    if (declared.answer !== null) {
      throw new AppError('wrong-state', { detail: 'This was answered already; the answer stays.' });
    }
    await declared.update({
      answer: text,
      answeredAt: clock.now(),
      answeredByUserId: actor.userId,
    });
    await touchOrder(order, rowVersion);
    await noteOrderEvent({
      orderId: order.id,
      kind: 'allergy-answered',
      actor,
      data: { allergyId },
    });
  });
}
