import type { Advice } from '#shared/contracts/estimates.ts';
import type { Blocker } from '#shared/contracts/staff.ts';
import { isListed, subjectOf } from '#shared/kitchen/clashes.ts';
import { strictestAnswer } from '#shared/kitchen/owners-answer.ts';
import type { OrderFacts } from '#shared/orders/transitions.ts';
import { AllergyRule } from '#api/db/models/allergy-rule.ts';
import type { DeclaredAllergy } from '#api/db/models/declared-allergy.ts';
import { LedgerEntry } from '#api/db/models/ledger-entry.ts';
import { LiftedStop } from '#api/db/models/lifted-stop.ts';
import type { OrderRevision } from '#api/db/models/order-revision.ts';
import type { Order } from '#api/db/models/order.ts';
import { StopTalk } from '#api/db/models/stop-talk.ts';
import { User } from '#api/db/models/user.ts';
import { estimateNow, openContentsOf } from '#api/modules/contents/content-changes.queries.ts';
import { hasPlace } from '#api/modules/plan/plan.queries.ts';

/**
 * What must be settled before an order is confirmed, each with what it waits for: every allergy
 * told in words that no baker has answered, every `stop` the owner has not lifted, and every lifted
 * one whose reason the customer has not read and accepted. The owner's table counts as it is now,
 * not as it was when the order was sent.
 */
export async function blockersOf(revision: OrderRevision): Promise<Blocker[]> {
  const { advice } = await estimateNow(revision);
  const stops = advice.filter(({ level }) => level === 'stop');
  if (stops.length === 0) return [];
  const where = { revisionId: revision.id };
  const [lifted, talks, rules] = await Promise.all([
    LiftedStop.findAll({ where }),
    StopTalk.findAll({ where }),
    AllergyRule.findAll(),
  ]);
  const talkers = await User.findAll({ where: { id: talks.map((it) => it.byUserId) } });
  const declared = (revision.allergies ?? []).filter(({ erasedAt }) => erasedAt === null);
  return stops.flatMap((stop): Blocker[] => {
    const isIt = (it: { code: string; about: string }) =>
      it.code === stop.code && it.about === stop.about;
    const lift = lifted.find(isIt);
    const talk = talks.find(isIt);
    const talked =
      talk === undefined
        ? null
        : {
            text: talk.text,
            by: talkers.find(({ id }) => id === talk.byUserId)?.name ?? '',
            at: talk.at.toISOString(),
          };
    if (lift !== undefined) {
      return lift.acceptedAt === null ? [{ ...stop, waitsFor: 'customer', talked }] : [];
    }
    if (stop.code === 'allergy-text') {
      const answered = declared.some(
        (it) => it.answer !== null && it.allergen === null && textAbout(it) === stop.about,
      );
      return answered ? [] : [{ ...stop, waitsFor: 'answer', talked }];
    }
    const things = isAboutAllergy(stop) ? thingsOf(stop, declared) : null;
    return [{ ...stop, ...waiting(stop, things, talked !== null, rules), talked }];
  });
}

/** How the rules name an allergy told in words. */
const textAbout = ({ freeText }: DeclaredAllergy): string => `allergy-text:${freeText.trim()}`;

const allergyCodes: readonly Advice['code'][] = ['allergen', 'allergen-unknown', 'kitchen'];

/** A stop about something guests declared: the talk about it is kept with what they declared. */
export function isAboutAllergy({ code }: Pick<Advice, 'code'>): boolean {
  return allergyCodes.includes(code);
}

/** The declarations a stop is about: `allergen:tree-nuts:pecan` is about `tree-nuts:pecan`. */
function thingsOf(stop: Advice, declared: readonly DeclaredAllergy[]): DeclaredAllergy[] {
  const subject = stop.about.slice(stop.about.indexOf(':') + 1);
  return declared.filter((it) => {
    const { allergen, species, severity, guests } = it;
    const listed = { allergen, species, severity, guests, text: '' };
    return isListed(listed) && subjectOf(listed) === subject;
  });
}

function waiting(
  stop: Advice,
  things: readonly DeclaredAllergy[] | null,
  talked: boolean,
  rules: readonly AllergyRule[],
): Pick<Blocker, 'waitsFor' | 'talk'> {
  if (things === null) {
    // What cannot be made, or does not fit, is no matter for a reason.
    if (!stop.talk) return { waitsFor: 'nothing', talk: false };
    return { waitsFor: talked ? 'reason' : 'talk', talk: true };
  }
  // The owner's table speaks of what the cake contains, not of the kitchen or of a label unread.
  const contained = stop.about.startsWith('allergen:');
  const answer = contained ? strictestAnswer(things, rules) : 'talk';
  if (answer === 'refuse') return { waitsFor: 'nothing', talk: false };
  const spoken = things.length > 0 && things.every((it) => it.answer !== null);
  return { waitsFor: spoken || answer === 'take' ? 'reason' : 'talk', talk: true };
}

/** What the table of moves asks about an order. */
export async function factsOf(order: Order, blockers: readonly Advice[]): Promise<OrderFacts> {
  const [planned, balance, contents] = await Promise.all([
    hasPlace(order.id),
    balanceOf(order.id),
    openContentsOf(order.currentRevisionId),
  ]);
  return {
    depositDue: order.terms.depositMinor > 0,
    planned,
    blocked: blockers.length > 0,
    balanceDue: balance > 0 && !order.terms.handoverWithBalance,
    contentsOpen: contents !== null,
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
