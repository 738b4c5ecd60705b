import { summariseCake } from '#shared/kitchen/summarise-design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { Order } from '#api/db/models/order.ts';
import { SheetSize } from '#api/db/models/sheet-size.ts';
import type { OrderRevision } from '#api/db/models/order-revision.ts';
import { preparedMenu } from '#api/modules/menu/menu.queries.ts';
import { designOf, loadRevisions } from './order-design.queries.ts';

/** Orders' cakes in a line each ("Three tiers, 10, 8 and 5 in, 71 portions"), by order. */
export async function summariesOf(orderIds: readonly string[]): Promise<Map<string, string>> {
  const orders = await Order.findAll({ where: { id: [...orderIds] } });
  const revisions = await loadRevisions(
    orders.flatMap(({ currentRevisionId }) => currentRevisionId ?? []),
  );
  const menu = await menuOfAllTimes();
  return new Map(
    orders.map(({ id, currentRevisionId }) => {
      const revision = revisions.get(currentRevisionId ?? '');
      return [id, revision === undefined ? '' : summariseRevision(revision, menu)];
    }),
  );
}

/** One revision's cake in a line. */
export function summariseRevision(revision: OrderRevision, menu: Menu): string {
  const { cake } = designOf(revision);
  const { fed } = revision.estimate.portions;
  if (cake === null) return 'Extras alone';
  return `${summariseCake(cake, menu)}, ${fed} ${fed === 1 ? 'portion' : 'portions'}`;
}

/** The menu with sheets that are no longer offered, so that old orders still have their names. */
export async function menuOfAllTimes(): Promise<Menu> {
  const [{ menu }, sheets] = await Promise.all([preparedMenu(), SheetSize.findAll()]);
  return {
    ...menu,
    sheetSizes: sheets.map(({ id, name, widthMm, depthMm, heightMm }) => ({
      id,
      name,
      widthMm,
      depthMm,
      heightMm,
    })),
  };
}
