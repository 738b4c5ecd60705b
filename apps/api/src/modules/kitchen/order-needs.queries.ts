import type { Design } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { groupBy } from '#shared/group-by.ts';
import { currentVersion, indexPantry } from '#shared/kitchen/formulas/pantry-index.ts';
import type { PantryIndex } from '#shared/kitchen/formulas/pantry-index.ts';
import { keptVersions, kitchenBook } from '#shared/kitchen/kitchen-book.ts';
import { needsOf } from '#shared/kitchen/needs/kitchen-needs.ts';
import type { KitchenNeeds } from '#shared/kitchen/needs/kitchen-needs.ts';
import { resolveDesign } from '#shared/kitchen/resolve-design.ts';
import type { ResolvedDesign } from '#shared/kitchen/resolve-design.ts';
import { currentClock } from '#api/db/current-database.ts';
import type { OrderRevision } from '#api/db/models/order-revision.ts';
import type { Order } from '#api/db/models/order.ts';
import { RevisionFormulaVersion } from '#api/db/models/revision-formula-version.ts';
import { menuOver } from '#api/modules/menu/menu-over.queries.ts';
import { designOf, loadRevisions } from '#api/modules/orders/order-design.queries.ts';
import { currentPantry } from '#api/modules/pantry/load-pantry.queries.ts';
import type { WholePantry } from '#api/modules/pantry/load-pantry.queries.ts';

/** An order with what it takes, by the formula versions it keeps. */
export type OrderNeeds = {
  readonly order: Order;
  readonly revision: OrderRevision;
  readonly design: Design;
  readonly menu: Menu;
  readonly resolved: ResolvedDesign;
  readonly needs: KitchenNeeds;
  /** The same for another design, as if the order were that. */
  readonly needsOf: (resolved: ResolvedDesign) => KitchenNeeds;
};

export type NeedsOfOrders = {
  readonly orders: readonly OrderNeeds[];
  readonly pantry: WholePantry;
  readonly index: PantryIndex;
};

/** What each of these orders takes. */
export async function needsOfOrders(orders: readonly Order[]): Promise<NeedsOfOrders> {
  const revisionIds = orders.flatMap(({ currentRevisionId }) => currentRevisionId ?? []);
  const [revisions, kept, pantry, over] = await Promise.all([
    loadRevisions(revisionIds),
    RevisionFormulaVersion.findAll({ where: { revisionId: revisionIds } }),
    currentPantry(),
    menuOver(currentClock().now()),
  ]);
  const index = indexPantry(pantry);
  const book = kitchenBook(pantry);
  const keptOf = groupBy(kept, ({ revisionId }) => revisionId);
  const menus = new Map<string, Menu>();
  const found = orders.flatMap((order): OrderNeeds[] => {
    const revision = revisions.get(order.currentRevisionId ?? '');
    if (revision === undefined) return [];
    const own = keptOf.get(revision.id) ?? [];
    const versionIds = keptVersions(
      own.map((it) => it.formulaVersionId),
      book,
    );
    // Most orders keep what is current, and share a menu.
    const key = [...versionIds]
      .filter(([formulaId, id]) => currentVersion(index, formulaId)?.id !== id)
      .map(([, id]) => id)
      .toSorted()
      .join(' ');
    const menu = menus.get(key) ?? over(book, (formulaId) => versionIds.get(formulaId));
    menus.set(key, menu);
    const design = designOf(revision);
    const resolved = resolveDesign(design, menu);
    const takes = (it: ResolvedDesign) =>
      needsOf({
        resolved: it,
        index,
        parts: pantry.parts,
        versionOf: (formulaId) =>
          versionIds.get(formulaId) ?? currentVersion(index, formulaId)?.id ?? null,
        mixers: pantry.mixers,
      });
    return [{ order, revision, design, menu, resolved, needs: takes(resolved), needsOf: takes }];
  });
  return { orders: found, pantry, index };
}

/** The same for one order. @throws when it has no revision */
export async function needsOfOrder(
  order: Order,
): Promise<OrderNeeds & Omit<NeedsOfOrders, 'orders'>> {
  const { orders, ...ground } = await needsOfOrders([order]);
  const [only] = orders;
  if (only === undefined) throw new Error(`Order ${order.id} has no revision.`);
  return { ...only, ...ground };
}
