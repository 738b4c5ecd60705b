import type { DeclaredAllergy, StaffOrder } from '#shared/contracts/staff.ts';
import { isLive } from '#shared/orders/transitions.ts';
import type { OrderEvent } from '#api/db/models/order-event.ts';
import { mayKitchenDo } from '#api/modules/kitchen/may-kitchen.queries.ts';
import { canMove } from '#api/modules/orders/change-order-status.command.ts';
import { designOf } from '#api/modules/orders/order-design.queries.ts';
import { pickupOf } from '#api/modules/orders/pickup.queries.ts';
import { mayPantryDo } from '#api/modules/pantry/may-pantry.queries.ts';
import type { Actor } from '#api/platform/actor.ts';
import { sentenceOf } from './event-sentences.ts';
import type { StaffOrderPage } from './staff-order.queries.ts';
import { mayStaff } from './staff-orders.policy.ts';

/** Everything about an order, for the people who make it and hand it over. */
export function presentStaffOrder(page: StaffOrderPage, actor: Actor): StaffOrder {
  const { order, revision } = page;
  return {
    number: order.number,
    code: order.code,
    status: order.status,
    rowVersion: order.rowVersion,
    pickup: pickupOf(order, revision),
    design: designOf(revision),
    estimate: page.estimate,
    agreedPrice: page.agreedPrice,
    allergies: allergiesOf(page),
    hold:
      page.hold === null
        ? null
        : { expiresAt: page.hold.expiresAt.toISOString(), needsLink: page.hold.needsLink },
    fits: page.fits,
    tasks: page.tasks,
    contacts: page.contacts.map((contact) => ({
      as: contact.role,
      name: contact.name,
      email: contact.email ?? '',
      phone: contact.phone ?? '',
      reachBy: contact.reachBy,
    })),
    messages: page.messages,
    unread: page.unread,
    photos: page.photos,
    events: page.events.map((event) => ({
      seq: event.seq,
      kind: event.kind,
      at: event.at.toISOString(),
      actor: actorName(event, page),
      sentence: sentenceOf(event),
    })),
    mail: page.mail,
    showPhotos: order.showPhotos,
    handover: handoverOf(page),
    blockers: page.blockers,
    lifted: page.lifted,
    contentChanges: page.contentChanges,
    can: rightsOf(page, actor),
  };
}

function allergiesOf({ revision, names }: StaffOrderPage): DeclaredAllergy[] {
  return (revision.allergies ?? [])
    .filter(({ erasedAt }) => erasedAt === null)
    .toSorted((a, b) => a.position - b.position)
    .map((it) => ({
      id: it.id,
      allergen: it.allergen,
      species: it.species,
      text: it.freeText,
      severity: it.severity,
      guests: it.guests,
      answer:
        it.answer === null || it.answeredAt === null
          ? null
          : {
              text: it.answer,
              by: names.get(it.answeredByUserId ?? '') ?? '',
              at: it.answeredAt.toISOString(),
            },
    }));
}

function handoverOf({ handover, photos, names }: StaffOrderPage): StaffOrder['handover'] {
  if (handover === null) return null;
  return {
    collectedBy: handover.collectedBy,
    at: handover.at.toISOString(),
    condition: handover.condition,
    photo: photos.find(({ id }) => id === handover.photoId) ?? null,
    by: names.get(handover.byUserId) ?? '',
  };
}

function actorName(event: OrderEvent, { names, contacts }: StaffOrderPage): string {
  if (event.actorKind === 'system') return 'Tierwell';
  if (event.actorKind === 'guest' || event.actorKind === 'customer') {
    return contacts.find(({ role }) => role === 'ordered')?.name ?? 'The customer';
  }
  return names.get(event.actorUserId ?? '') ?? 'Somebody who has left';
}

function rightsOf(page: StaffOrderPage, actor: Actor): StaffOrder['can'] {
  const { order, revision, contentChanges } = page;
  const isOpen = isLive(order.status);
  const open = (revision.allergies ?? []).some(
    ({ answer, erasedAt }) => answer === null && erasedAt === null,
  );
  return {
    confirm: mayStaff(actor, 'confirm') && canMove(order, 'confirm', actor),
    decline: mayStaff(actor, 'decline') && canMove(order, 'decline', actor),
    move: mayStaff(actor, 'move') && canMove(order, 'move', actor),
    start: mayStaff(actor, 'start') && canMove(order, 'start', actor),
    ready: mayStaff(actor, 'ready') && canMove(order, 'ready', actor),
    collect: mayStaff(actor, 'collect') && canMove(order, 'collect', actor),
    uncollected: mayStaff(actor, 'uncollected') && canMove(order, 'uncollected', actor),
    write: mayStaff(actor, 'write'),
    answerAllergy: mayStaff(actor, 'answer-allergy') && open,
    recordTalk: mayStaff(actor, 'record-talk') && canMove(order, 'confirm', actor),
    liftStop: mayStaff(actor, 'lift-stop') && canMove(order, 'confirm', actor),
    renewLink: mayStaff(actor, 'renew-link'),
    addPhotos: mayStaff(actor, 'add-photos'),
    sendMailAgain: mayStaff(actor, 'send-mail-again'),
    seeKitchen: mayKitchenDo(actor, 'see-kitchen-sheet'),
    seeCost: mayKitchenDo(actor, 'see-order-cost'),
    seePantry: mayPantryDo(actor, 'see'),
    acknowledgeContents:
      mayStaff(actor, 'acknowledge-contents') &&
      isOpen &&
      contentChanges.some(({ acknowledged }) => acknowledged === null),
    tellContents:
      mayStaff(actor, 'tell-contents') &&
      isOpen &&
      contentChanges.some(({ told }) => told === null),
  };
}
