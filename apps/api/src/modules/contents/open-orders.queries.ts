import type { OrderContents } from '#shared/contracts/contents.ts';
import type { Advice } from '#shared/contracts/estimates.ts';
import { orderStatuses } from '#shared/contracts/vocabulary.ts';
import { localAt } from '#shared/dates/local-time.ts';
import { groupBy } from '#shared/group-by.ts';
import { evaluateDesign } from '#shared/kitchen/evaluate-design.ts';
import { keptVersions, kitchenBook } from '#shared/kitchen/kitchen-book.ts';
import { contentsOfDesign, isAboutContents } from '#shared/kitchen/order-contents.ts';
import { isLive } from '#shared/orders/transitions.ts';
import type { OrderRevision } from '#api/db/models/order-revision.ts';
import { Order } from '#api/db/models/order.ts';
import { RevisionFormulaVersion } from '#api/db/models/revision-formula-version.ts';
import { menuOver } from '#api/modules/menu/menu-over.queries.ts';
import { designOf, loadRevisions } from '#api/modules/orders/order-design.queries.ts';
import { currentPantry } from '#api/modules/pantry/load-pantry.queries.ts';

/** An order that is not handed over yet, and what is in it by the pantry as it stands. */
export type OpenOrder = {
  readonly order: Order;
  readonly revision: OrderRevision;
  readonly holds: OrderContents;
  /** Everything advised about what is in it; worked out when it is first asked for. */
  advice(): readonly Advice[];
};

/**
 * What every open order contains by today's labels and the formula versions it keeps, by order.
 * Inside a transaction, with what that has written.
 */
export async function openOrders(now: Date): Promise<Map<string, OpenOrder>> {
  const orders = await Order.findAll({ where: { status: orderStatuses.filter(isLive) } });
  const revisionIds = orders.flatMap(({ currentRevisionId }) => currentRevisionId ?? []);
  const [revisions, kept, pantry, over] = await Promise.all([
    loadRevisions(revisionIds),
    RevisionFormulaVersion.findAll({ where: { revisionId: revisionIds } }),
    currentPantry(),
    menuOver(now),
  ]);
  const book = kitchenBook(pantry);
  const keptOf = groupBy(kept, ({ revisionId }) => revisionId);
  const found = new Map<string, OpenOrder>();
  for (const order of orders) {
    const revision = revisions.get(order.currentRevisionId ?? '');
    if (revision === undefined) continue;
    const own = keptOf.get(revision.id) ?? [];
    const versionIds = keptVersions(
      own.map((it) => it.formulaVersionId),
      book,
    );
    const menu = over(book, (formulaId) => versionIds.get(formulaId));
    const design = designOf(revision);
    const today = localAt(now, order.zone).date;
    found.set(order.id, {
      order,
      revision,
      holds: contentsOfDesign(design, menu),
      advice: onceOnly(() =>
        evaluateDesign({ design, date: order.pickupDate }, menu, today).advice.filter(
          isAboutContents,
        ),
      ),
    });
  }
  return found;
}

function onceOnly<T>(work: () => T): () => T {
  let done: { readonly result: T } | null = null;
  return () => (done ??= { result: work() }).result;
}
