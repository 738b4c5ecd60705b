import { Op } from 'sequelize';
import { Consent } from '#api/db/models/consent.ts';
import { ContentChange } from '#api/db/models/content-change.ts';
import { DeclaredAllergy } from '#api/db/models/declared-allergy.ts';
import { DeclaredDiet } from '#api/db/models/declared-diet.ts';
import { Handover } from '#api/db/models/handover.ts';
import { IdempotencyKey } from '#api/db/models/idempotency-key.ts';
import { Identity } from '#api/db/models/identity.ts';
import { ItemTier } from '#api/db/models/item-tier.ts';
import { LiftedStop } from '#api/db/models/lifted-stop.ts';
import { MailAttempt } from '#api/db/models/mail-attempt.ts';
import { Message } from '#api/db/models/message.ts';
import { OrderContact } from '#api/db/models/order-contact.ts';
import { OrderItem } from '#api/db/models/order-item.ts';
import { OrderRevision } from '#api/db/models/order-revision.ts';
import { Order } from '#api/db/models/order.ts';
import { Photo } from '#api/db/models/photo.ts';
import { Quote } from '#api/db/models/quote.ts';
import { SentMail } from '#api/db/models/sent-mail.ts';
import { StopTalk } from '#api/db/models/stop-talk.ts';
import { Token } from '#api/db/models/token.ts';
import type { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import { endSessionsOf } from '#api/modules/sessions/end-sessions.command.ts';
import { AppError } from '#api/platform/app-error.ts';
import { refuseWhileOrdersLive } from './live-orders.ts';

/**
 * Blanks everything that says who a customer is or what they told us: account, contacts, allergies,
 * messages, words, mail, photos. What was made and paid, and that it happened, stays. Throws
 * `wrong-state` while an order is open.
 */
export async function eraseAccount({ clock }: Pick<Deps, 'clock'>, user: User): Promise<void> {
  await inTransaction(async () => {
    if (user.role !== 'customer' || user.erasedAt !== null) throw new AppError('wrong-state');
    await refuseWhileOrdersLive(user.id);
    const orders = await Order.findAll({ where: { customerUserId: user.id } });
    const orderId = orders.map(({ id }) => id);
    const now = clock.now();
    await eraseOrders(orderId, now);
    await eraseMail(user, orderId, now);
    await Consent.update(
      { withdrawnAt: now },
      { where: { [Op.or]: [{ userId: user.id }, { orderId }], withdrawnAt: null } },
    );
    await Identity.destroy({ where: { userId: user.id } });
    const theirs = user.email === null ? [] : [{ email: user.email }];
    await Token.update(
      { email: null, usedAt: now, data: {} },
      { where: { [Op.or]: [{ userId: user.id }, ...theirs] } },
    );
    await endSessionsOf(user.id);
    await user.update({ email: null, name: '', phone: null, passwordHash: null, erasedAt: now });
    await noteAudit('system', {
      action: 'erase-account',
      subjectKind: 'user',
      subjectId: user.id,
      data: { orders: orderId.length },
    });
  });
}

async function eraseOrders(orderId: readonly string[], now: Date): Promise<void> {
  const where = { orderId: [...orderId] };
  await OrderContact.update({ name: '', email: null, phone: null, erasedAt: now }, { where });
  await Message.update({ body: '', authorName: '', erasedAt: now }, { where });
  await Handover.update({ collectedBy: '', condition: '', erasedAt: now }, { where });
  await Photo.update({ note: '', removedAt: now }, { where: { ...where, removedAt: null } });
  await IdempotencyKey.destroy({ where });
  await Quote.update({ note: '' }, { where });
  // What a stop was about may be what a guest told in words; that it was lifted stays.
  for (const stop of await LiftedStop.findAll({ where })) {
    await stop.update({ about: `erased:${stop.id}`, reason: '' });
  }
  for (const talk of await StopTalk.findAll({ where })) {
    await talk.update({ about: `erased:${talk.id}`, text: '' });
  }
  await Order.update(
    {
      endedReason: null,
      sentFromHash: null,
      privateKeyHash: null,
      // Browsers that opened the old link see nothing any more.
      keyRenewedAt: now,
      showPhotos: false,
    },
    { where: { id: [...orderId] } },
  );
  for (const revision of await OrderRevision.findAll({ where })) await eraseRevision(revision, now);
}

async function eraseRevision(revision: OrderRevision, now: Date): Promise<void> {
  const where = { revisionId: revision.id };
  await DeclaredAllergy.update(
    { allergen: null, species: null, freeText: '', answer: null, erasedAt: now },
    { where },
  );
  await DeclaredDiet.destroy({ where });
  const items = await OrderItem.findAll({ where });
  await OrderItem.update({ note: '' }, { where });
  await ItemTier.update({ words: null }, { where: { itemId: items.map(({ id }) => id) } });
  await revision.update({
    note: '',
    dietNote: '',
    changeNote: null,
    infants: false,
    susceptibleGuests: false,
    addressStreet: null,
    addressTown: null,
    addressPostcode: null,
    addressAccess: null,
    dayContactName: null,
    dayContactPhone: null,
    // Advice repeats what guests cannot eat; the price and what the cake contains stay.
    estimate: { ...revision.estimate, advice: [] },
  });
  await ContentChange.update({ advice: [], acknowledgedNote: '', toldHow: '' }, { where });
}

async function eraseMail(user: User, orderId: string[], now: Date): Promise<void> {
  const toThem = user.email === null ? [] : [{ toAddress: user.email }];
  const mail = await SentMail.findAll({
    where: { [Op.or]: [{ orderId }, { userId: user.id }, ...toThem] },
  });
  const sentMailId = mail.map(({ id }) => id);
  await MailAttempt.update({ response: '' }, { where: { sentMailId } });
  // The key is unique and says what happened; the message's id stays for threads and bounces.
  await SentMail.update(
    {
      toAddress: '',
      replyTo: null,
      subject: '',
      html: '',
      text: '',
      attachments: [],
      lastError: null,
      erasedAt: now,
    },
    { where: { id: sentMailId } },
  );
  await SentMail.update(
    { state: 'dropped', leasedBy: null, leasedUntil: null },
    { where: { id: sentMailId, state: ['queued', 'leased'] } },
  );
}
