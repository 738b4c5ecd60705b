import type { Advice } from '#shared/contracts/estimates.ts';
import type { OrderFacts } from '#shared/orders/transitions.ts';
import { LedgerEntry } from '#api/db/models/ledger-entry.ts';
import { LiftedStop } from '#api/db/models/lifted-stop.ts';
import type { OrderRevision } from '#api/db/models/order-revision.ts';
import type { Order } from '#api/db/models/order.ts';
import { hasPlace } from '#api/modules/plan/plan.queries.ts';

/**
 * What must be settled before an order is confirmed: every `stop` the owner has not lifted, and
 * every allergy told in words that no baker has answered.
 */
export async function blockersOf(revision: OrderRevision): Promise<Advice[]> {
  const lifted = await LiftedStop.findAll({ where: { revisionId: revision.id } });
  const isLifted = (advice: Advice) =>
    lifted.some(({ code, about }) => code === advice.code && about === advice.about);
  const answered = (revision.allergies ?? [])
    .filter((it) => it.allergen === null && it.answer !== null)
    .map((it) => textAbout(it.freeText));
  return stopsOf(revision).filter(
    (advice) =>
      !isLifted(advice) && !(advice.code === 'allergy-text' && answered.includes(advice.about)),
  );
}

/** How the rules name an allergy told in words. */
const textAbout = (text: string) => `allergy-text:${text}`;

function stopsOf({ estimate }: OrderRevision): Advice[] {
  return estimate.advice.filter(({ level }) => level === 'stop');
}

/** What the table of moves asks about an order. */
export async function factsOf(order: Order, blockers: readonly Advice[]): Promise<OrderFacts> {
  const [planned, balance] = await Promise.all([hasPlace(order.id), balanceOf(order.id)]);
  return {
    depositDue: order.terms.depositMinor > 0,
    planned,
    blocked: blockers.length > 0,
    balanceDue: balance > 0 && !order.terms.handoverWithBalance,
  };
}

/** What is still owed, by the ledger: charges and adjustments less what came in. */
async function balanceOf(orderId: string): Promise<number> {
  const entries = await LedgerEntry.findAll({ where: { orderId } });
  return entries.reduce((sum, { kind, amountMinor }) => {
    if (kind === 'charge' || kind === 'adjustment' || kind === 'refund') return sum + amountMinor;
    return kind === 'payment' || kind === 'credit' ? sum - amountMinor : sum;
  }, 0);
}
