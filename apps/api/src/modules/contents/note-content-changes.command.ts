import { contentDifferences } from '#shared/kitchen/content-differences.ts';
import { newAdvice } from '#shared/kitchen/order-contents.ts';
import type { LabelRegion } from '#shared/contracts/vocabulary.ts';
import { groupBy } from '#shared/group-by.ts';
import { ContentChange } from '#api/db/models/content-change.ts';
import { noteOrderEvent } from '#api/modules/orders/note-order-event.command.ts';
import { enqueue } from '#api/outbox/enqueue.ts';
import type { Staff } from '#api/platform/actor.ts';
import { newId } from '#api/platform/ids.ts';
import {
  adviceBefore,
  contentsBefore,
  labelRegion,
  mailedAt,
  tellingKey,
} from './content-changes.queries.ts';
import { openOrders } from './open-orders.queries.ts';
import type { OpenOrder } from './open-orders.queries.ts';

/**
 * How long a slip of the pen can be put right before customers hear of it, milliseconds. Staff
 * hear at once, and nothing is handed over meanwhile.
 */
const graceMs = 10 * 60_000;

/** What was saved: a product's label, or a version that took another's place in orders. */
export type ChangeCause = { readonly ingredientId: string } | { readonly formulaVersionId: string };

export type NotedSave = {
  /** As `openOrders` told it before the save, in the same transaction. */
  readonly before: ReadonlyMap<string, OpenOrder>;
  readonly cause: ChangeCause;
  readonly actor: Staff;
  readonly now: Date;
};

/**
 * Derives every open order again after something in the pantry was saved, and notes each that now
 * contains something else than its customer was told: an event, a word to the studio at once and
 * to the customer a little later. A change that was taken back before anybody was told is ended.
 * @returns the numbers of the orders whose customers have something to hear
 */
export async function noteContentChanges(save: NotedSave): Promise<number[]> {
  const { before, now } = save;
  const [after, region] = await Promise.all([openOrders(now), labelRegion()]);
  const changed = [...after.values()].flatMap((order) => {
    const old = before.get(order.order.id);
    return old !== undefined && differs(old, order, region) ? [{ old, order }] : [];
  });
  if (changed.length === 0) return [];
  const standing = await standingChanges(changed.map(({ order }) => order.revision.id));
  const saveId = newId();
  const touched: number[] = [];
  for (const { old, order } of changed) {
    const earlier = standing.get(order.revision.id) ?? [];
    if (await noteOne({ ...save, saveId, old, order, earlier, region })) {
      touched.push(order.order.number);
    }
  }
  if (touched.length > 0) {
    await enqueue('contents-changed', { saveId }, { uniqueKey: `contents-changed:${saveId}` });
  }
  return touched.sort((a, b) => a - b);
}

function differs(old: OpenOrder, order: OpenOrder, region: LabelRegion): boolean {
  // Advice hangs on what is in it and handled near it: where neither is new, nor is that.
  if (contentDifferences(old.holds, order.holds, region).length === 0) return false;
  return (
    isOther(old.holds, order.holds, region) || newAdvice(old.advice(), order.advice()).length > 0
  );
}

/** What is handled in the kitchen touches an order only where a guest declared it: by advice. */
function isOther(a: OpenOrder['holds'], b: OpenOrder['holds'], region: LabelRegion): boolean {
  return contentDifferences(a, { ...b, handled: a.handled }, region).length > 0;
}

type Standing = { readonly change: ContentChange; readonly told: boolean };

async function standingChanges(revisionIds: readonly string[]): Promise<Map<string, Standing[]>> {
  const changes = await ContentChange.findAll({
    where: { revisionId: [...revisionIds], endedAt: null },
    order: [['n', 'ASC']],
  });
  const mailed = await mailedAt(changes);
  return groupBy(
    changes.map((change) => ({
      change,
      told: change.toldAt !== null || mailed.has(change.id),
    })),
    ({ change }) => change.revisionId,
  );
}

type OneChange = NotedSave & {
  readonly saveId: string;
  readonly old: OpenOrder;
  readonly order: OpenOrder;
  readonly earlier: readonly Standing[];
  readonly region: LabelRegion;
};

/** Whether there is something to tell; false where it was put right before anybody was told. */
async function noteOne(one: OneChange): Promise<boolean> {
  const { saveId, old, order, earlier, region, cause, actor, now } = one;
  const { id: orderId } = order.order;
  const told = earlier.filter((it) => it.told).map(({ change }) => change);
  for (const { change } of earlier.filter((it) => !it.told)) await change.update({ endedAt: now });
  const known = contentsBefore(order.revision, told, old.holds);
  const clashes = newAdvice(adviceBefore(order.revision, told), order.advice()).length > 0;
  if (!clashes && !isOther(known, order.holds, region)) {
    await noteOrderEvent({ orderId, kind: 'contents-put-right', actor });
    return false;
  }
  const last = await ContentChange.max<number | null, ContentChange>('n', { where: { orderId } });
  const change = await ContentChange.create({
    orderId,
    revisionId: order.revision.id,
    n: (last ?? 0) + 1,
    saveId,
    ingredientId: 'ingredientId' in cause ? cause.ingredientId : null,
    formulaVersionId: 'formulaVersionId' in cause ? cause.formulaVersionId : null,
    told: known,
    holds: order.holds,
    advice: [...order.advice()],
    clashes,
    mailAt: new Date(now.getTime() + graceMs),
    byUserId: actor.userId,
  });
  await noteOrderEvent({
    orderId,
    kind: 'contents-changed',
    actor,
    data: { contentChangeId: change.id },
  });
  await enqueue(
    'contents-to-tell',
    { orderId, contentChangeId: change.id },
    { uniqueKey: tellingKey(change.id), orderId, notBefore: change.mailAt },
  );
  return true;
}
