import { createHash } from 'node:crypto';
import * as z from 'zod/mini';
import type { Estimate } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { submittedOrder } from '#shared/contracts/orders.ts';
import type { SubmitOrder, SubmittedOrder } from '#shared/contracts/orders.ts';
import { findTransition } from '#shared/orders/transitions.ts';
import type { OrderTransition } from '#shared/orders/transitions.ts';
import { Consent } from '#api/db/models/consent.ts';
import { IdempotencyKey } from '#api/db/models/idempotency-key.ts';
import { OrderContact } from '#api/db/models/order-contact.ts';
import { Order } from '#api/db/models/order.ts';
import { Studio } from '#api/db/models/studio.ts';
import { readPlanVersions } from '#api/db/plan-versions.ts';
import type { Deps } from '#api/modules/deps.ts';
import { estimateDesign } from '#api/modules/estimates/estimate-design.queries.ts';
import { freshMenu } from '#api/modules/menu/menu.queries.ts';
import { attachPhotos } from '#api/modules/photos/attach-photos.command.ts';
import { placeHold } from '#api/modules/plan/place-hold.command.ts';
import type { HoldOutcome } from '#api/modules/plan/place-hold.command.ts';
import { currentWorkTimeVersionId } from '#api/modules/plan/plan.queries.ts';
import { userIdOf } from '#api/platform/actor.ts';
import type { Actor } from '#api/platform/actor.ts';
import { AppError } from '#api/platform/app-error.ts';
import { hashKey, newId, newOrderCode } from '#api/platform/ids.ts';
import { privateKeyOf, senderKeyOf } from '#api/platform/private-link.ts';
import { enqueueEmails, orderActorOf } from './change-order-status.command.ts';
import { designOfForm, fieldOfForm, refuseImpossible } from './design-of-form.ts';
import { noteOrderEvent, orderRoleOf } from './note-order-event.command.ts';
import { writeRevision } from './write-revision.ts';

export type SubmitInput = {
  readonly form: SubmitOrder;
  readonly idempotencyKey: string;
  readonly actor: Actor;
  /** Of the network the request came from; its hash limits unanswered places. */
  readonly network: string;
};

type Submitted = { readonly order: Order; readonly answer: SubmittedOrder };

/** How long the same key still answers the same order. */
const keyDays = 30;

/** What is kept of the answer: the key is worked out again, since it is stored nowhere. */
const keptAnswer = z.omit(submittedOrder, { key: true });

/**
 * A label, a formula or a price was saved since the order was worked out. An order that is not yet
 * written is not derived again with the open ones, so it is worked out once more.
 */
class CatalogueChanged extends Error {
  override name = 'CatalogueChanged';
}

/** Another request with this key was faster; carries nothing, its order is read instead. */
class SentAlready extends Error {
  override name = 'SentAlready';
}

/**
 * Takes an order: prices it again, keeps a place in the plan for it where there is one, and writes
 * it with its events and e-mails in one transaction. The same key twice is one order.
 * @throws `price-changed`, `date-gone`, `too-many-holds`, `key-reused`, `invalid-input`, `not-allowed`,
 * `unavailable` while somebody saves the catalogue over and over
 */
export async function submitOrder(deps: Deps, input: SubmitInput): Promise<Submitted> {
  const transition = submitTransition(input.actor);
  const requestHash = createHash('sha256').update(JSON.stringify(input.form)).digest('hex');
  const before = await findSubmitted(deps, input, requestHash);
  if (before !== null) return before;
  for (let turn = 1; ; turn += 1) {
    const prepared = { ...(await prepare(deps, input.form)), transition };
    try {
      return await placeAndWrite(deps, input, prepared, requestHash);
    } catch (error) {
      if (error instanceof CatalogueChanged) {
        if (turn < mostTurns) continue;
        throw new AppError('unavailable', {
          detail: 'We are changing our menu this very moment. Nothing was sent; please try again.',
        });
      }
      if (!(error instanceof SentAlready)) throw error;
      const meanwhile = await findSubmitted(deps, input, requestHash);
      if (meanwhile === null) throw error;
      return meanwhile;
    }
  }
}

/** How often an order is worked out while somebody is at the catalogue. */
const mostTurns = 5;

type Prepared = {
  /** Of the catalogue it was worked out with. */
  readonly catalogueVersion: number;
  readonly menu: Menu;
  readonly estimate: Estimate;
  readonly transition: OrderTransition;
};

async function prepare({ clock }: Deps, form: SubmitOrder): Promise<Omit<Prepared, 'transition'>> {
  const { catalogueVersion } = await readPlanVersions();
  const menu = await freshMenu();
  const { date } = form.day;
  const estimate = estimateDesign(
    { design: designOfForm(form), date, collectAt: form.day.windowStart },
    { menu, now: clock.now(), fieldOf: fieldOfForm },
  );
  refuseImpossible(form, menu, estimate);
  const { totalMinor } = estimate.price;
  if (form.seenTotalMinor !== null && form.seenTotalMinor !== totalMinor) {
    throw new AppError('price-changed', {
      detail: 'The price is another one now. Have a look, and send it again if it suits you.',
      facts: { estimate, seenTotalMinor: form.seenTotalMinor, totalMinor },
    });
  }
  return { catalogueVersion, menu, estimate };
}

async function placeAndWrite(
  deps: Deps,
  input: SubmitInput,
  prepared: Prepared,
  requestHash: string,
): Promise<Submitted> {
  const { form, actor } = input;
  const { date, windowStart } = form.day;
  if (date === null || windowStart === null) throw new Error('The contract asks for a day.');
  const orderId = newId();
  const workTimeVersionId = await currentWorkTimeVersionId();
  const { value } = await placeHold(
    {
      orderId,
      design: designOfForm(form),
      pickup: { date, windowStart },
      holder: actor.kind === 'customer' || actor.kind === 'staff' ? 'known' : 'guest',
      email: form.you.email,
      sentFromHash: hashKey(input.network),
    },
    async (placed) => {
      if ((await IdempotencyKey.findOne({ where: keyRow(input) })) !== null) {
        throw new SentAlready();
      }
      const { catalogueVersion } = await readPlanVersions();
      if (catalogueVersion !== prepared.catalogueVersion) throw new CatalogueChanged();
      const order = await writeOrder(deps, { ...input, orderId, placed, ...prepared });
      const { revisionId, cakeItemId } = await writeRevision({
        orderId,
        n: 1,
        design: designOfForm(form),
        estimate: prepared.estimate,
        pickup: {
          date: placed.window.date,
          start: placed.window.startMinute,
          minutes: placed.window.minutes,
        },
        menu: prepared.menu,
        workTimeVersionId,
        createdByRole: orderRoleOf(actor),
        createdByUserId: userIdOf(actor),
      });
      await order.update({ currentRevisionId: revisionId });
      await writeConsents(orderId, form, prepared.menu);
      await attachPhotos(orderId, form.photos);
      await noteSubmitted(order, input, prepared.transition);
      const kept = {
        code: order.code,
        number: order.number,
        hold:
          placed.hold === null
            ? null
            : {
                expiresAt: placed.hold.expiresAt.toISOString(),
                needsLink: placed.hold.needsLink,
              },
      };
      await IdempotencyKey.create({
        ...keyRow(input),
        requestHash,
        status: 201,
        response: JSON.stringify(kept),
        orderId,
        expiresAt: new Date(deps.clock.now().getTime() + keyDays * 86_400_000),
      });
      return {
        revisionId,
        itemId: cakeItemId,
        value: { order, answer: { ...kept, key: keyFor(deps, actor, order) } },
      };
    },
  );
  return value;
}

async function writeOrder(
  { env }: Deps,
  input: SubmitInput & Prepared & { readonly orderId: string; readonly placed: HoldOutcome },
): Promise<Order> {
  const { form, orderId, placed, estimate, menu, actor, transition } = input;
  const studio = await Studio.findByPk(1, { rejectOnEmpty: true });
  const highest = await Order.max<number | null, Order>('number');
  const { you } = form;
  const order = await Order.create({
    id: orderId,
    number: highest === null ? studio.firstOrderNumber : highest + 1,
    code: newOrderCode(),
    status: transition.to,
    customerUserId: actor.kind === 'customer' ? actor.userId : null,
    occasionId: form.day.occasionId,
    currency: estimate.price.currency,
    terms: {
      depositMinor: estimate.price.depositMinor,
      balanceDueDays: menu.priceBook.balanceDueDays,
      handoverWithBalance: false,
    },
    pickupDate: placed.window.date,
    windowStartMinute: placed.window.startMinute,
    windowMinutes: placed.window.minutes,
    zone: studio.zone,
    pickupAt: placed.window.startAt,
    dateAnswer: placed.answer,
    privateKeyHash: hashKey(privateKeyOf(env.sessionSecret, { id: orderId, keyRenewedAt: null })),
    showPhotos: form.consents.showPhotos,
    sentFromHash: hashKey(input.network),
  });
  await OrderContact.create({
    orderId,
    role: 'ordered',
    name: you.name,
    email: you.email,
    phone: you.phone === '' ? null : you.phone,
    reachBy: you.reachBy,
  });
  if (you.otherCollects) {
    await OrderContact.create({
      orderId,
      role: 'collects',
      name: you.collectorName,
      phone: you.collectorPhone === '' ? null : you.collectorPhone,
    });
  }
  return order;
}

/** What was agreed to, and by which text; not having said yes to photos is written too. */
async function writeConsents(orderId: string, form: SubmitOrder, menu: Menu): Promise<void> {
  const policyOf = (kind: Menu['policies'][number]['kind']) =>
    menu.policies.find((policy) => policy.kind === kind)?.versionId ?? null;
  const { consents, day } = form;
  await Consent.bulkCreate([
    ...menu.policies.map(({ versionId }) => ({
      orderId,
      kind: 'policies' as const,
      policyVersionId: versionId,
      given: consents.policies,
    })),
    ...(day.allergies.length === 0
      ? []
      : [
          {
            orderId,
            kind: 'allergy-data' as const,
            policyVersionId: policyOf('allergy'),
            given: consents.allergyData,
          },
        ]),
    {
      orderId,
      kind: 'show-photos' as const,
      policyVersionId: policyOf('photo'),
      given: consents.showPhotos,
    },
  ]);
}

async function noteSubmitted(
  order: Order,
  { actor, form }: SubmitInput,
  transition: OrderTransition,
): Promise<void> {
  await noteOrderEvent({
    orderId: order.id,
    kind: 'submitted',
    actor,
    fromStatus: null,
    toStatus: transition.to,
    data: { number: order.number, dateAnswer: order.dateAnswer, asked: form.askWithoutDate },
  });
  await enqueueEmails(order.id, transition, order.rowVersion);
}

/** The order an earlier request with this key became, or null. @throws `key-reused` */
async function findSubmitted(
  deps: Deps,
  input: SubmitInput,
  requestHash: string,
): Promise<Submitted | null> {
  const row = await IdempotencyKey.findOne({ where: keyRow(input) });
  if (row === null || row.orderId === null) return null;
  if (row.requestHash !== requestHash) {
    throw new AppError('key-reused', {
      detail: 'Something else was sent under this key. Reload the page and send again.',
    });
  }
  const order = await Order.findByPk(row.orderId, { rejectOnEmpty: true });
  const kept = z.parse(keptAnswer, JSON.parse(row.response));
  return {
    order,
    answer: { ...kept, key: keyFor(deps, input.actor, order) },
  };
}

function keyRow({ idempotencyKey }: SubmitInput) {
  return { scope: 'submit-order', key: idempotencyKey };
}

/**
 * Guests get a key of their own; whoever is signed in finds the order in the account. Once the
 * studio has renewed the link, sending the same again opens nothing: the new link does.
 */
function keyFor({ env }: Deps, actor: Actor, order: Order): string | null {
  const known = actor.kind === 'customer' || actor.kind === 'staff';
  return known || order.keyRenewedAt !== null ? null : senderKeyOf(env.sessionSecret, order);
}

/** @throws `not-allowed` for whoever the table of moves does not let send orders */
function submitTransition(actor: Actor): OrderTransition {
  const transition = findTransition(null, 'submit', orderActorOf(actor));
  if (transition === null) throw new AppError('not-allowed');
  return transition;
}
