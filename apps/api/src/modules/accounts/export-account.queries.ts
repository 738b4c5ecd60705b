import { Consent } from '#api/db/models/consent.ts';
import { ContentChange } from '#api/db/models/content-change.ts';
import { DeclaredAllergy } from '#api/db/models/declared-allergy.ts';
import { Identity } from '#api/db/models/identity.ts';
import { ItemTier } from '#api/db/models/item-tier.ts';
import { LiftedStop } from '#api/db/models/lifted-stop.ts';
import { Message } from '#api/db/models/message.ts';
import { OrderContact } from '#api/db/models/order-contact.ts';
import { OrderItem } from '#api/db/models/order-item.ts';
import { OrderRevision } from '#api/db/models/order-revision.ts';
import { Order } from '#api/db/models/order.ts';
import { Photo } from '#api/db/models/photo.ts';
import { SentMail } from '#api/db/models/sent-mail.ts';
import { StopTalk } from '#api/db/models/stop-talk.ts';
import { User } from '#api/db/models/user.ts';
import { notFound } from '#api/platform/app-error.ts';
import type { AccountExport } from '#shared/contracts/accounts.ts';

type ExportedOrder = AccountExport['orders'][number];

/** Everything that is kept about a customer, to take away; throws `not-found`. */
export async function exportAccount(userId: string): Promise<AccountExport> {
  const user = await User.findByPk(userId);
  if (user === null) throw notFound();
  const orders = await Order.findAll({
    where: { customerUserId: userId },
    order: [['number', 'ASC']],
  });
  const orderIds = orders.map(({ id }) => id);
  const consents = [
    ...(await Consent.findAll({ where: { userId } })),
    ...(await Consent.findAll({ where: { orderId: orderIds, userId: null } })),
  ];
  const identities = await Identity.findAll({ where: { userId } });
  return {
    account: {
      name: user.name,
      email: user.email ?? '',
      phone: user.phone,
      createdAt: user.createdAt.toISOString(),
      signsInWith: ['e-mail link', ...identities.map(({ provider }) => provider)],
    },
    consents: consents.map(({ kind, given, at }) => ({ kind, given, at: at.toISOString() })),
    orders: await Promise.all(orders.map(exportOrder)),
  };
}

async function exportOrder(order: Order): Promise<ExportedOrder> {
  const where = { orderId: order.id };
  const revisions = await OrderRevision.findAll({ where, order: [['n', 'ASC']] });
  const current = revisions.find(({ id }) => id === order.currentRevisionId) ?? revisions.at(-1);
  const { number, code, status, pickupDate, currency } = order;
  const at = order.createdAt.toISOString();
  const [contacts, messages, photos, mail, inRevision] = await Promise.all([
    OrderContact.findAll({ where }),
    Message.findAll({ where, order: [['createdAt', 'ASC']] }),
    Photo.findAll({ where: { ...where, removedAt: null } }),
    SentMail.findAll({ where }),
    exportRevision(current),
  ]);
  return {
    number,
    code,
    status,
    createdAt: at,
    pickupDate,
    currency,
    totalMinor: current?.totalMinor ?? 0,
    ...inRevision,
    contacts: contacts.map(({ role, name, email, phone }) => ({ as: role, name, email, phone })),
    messages: messages.map((each) => ({
      from: each.sender,
      author: each.authorName,
      body: each.body,
      at: each.createdAt.toISOString(),
    })),
    photos: photos.map(({ id, kind, note, createdAt }) => ({
      id,
      kind,
      note,
      at: createdAt.toISOString(),
    })),
    // What was sent to the studio's own people about the order is theirs.
    mail: mail
      .filter(({ toAddress }) => contacts.some(({ email }) => email === toAddress))
      .map(({ toAddress, subject, text, createdAt }) => ({
        to: toAddress,
        subject,
        text,
        at: createdAt.toISOString(),
      })),
  };
}

async function exportRevision(
  revision: OrderRevision | undefined,
): Promise<Pick<ExportedOrder, 'allergies' | 'words' | 'notes'>> {
  if (revision === undefined) return { allergies: [], words: [], notes: [] };
  const where = { revisionId: revision.id };
  const allergies = await DeclaredAllergy.findAll({ where, order: [['position', 'ASC']] });
  const items = await OrderItem.findAll({ where });
  const changes = await ContentChange.findAll({ where, order: [['n', 'ASC']] });
  const talks = await StopTalk.findAll({ where, order: [['at', 'ASC']] });
  const lifted = await LiftedStop.findAll({ where, order: [['liftedAt', 'ASC']] });
  const tiers = await ItemTier.findAll({ where: { itemId: items.map(({ id }) => id) } });
  return {
    allergies: allergies.map(({ allergen, freeText, severity, guests, answer }) => ({
      allergen,
      text: freeText,
      severity,
      guests,
      answer,
    })),
    words: tiers.flatMap(({ words }) => (words === null ? [] : [words])),
    notes: [
      revision.note,
      revision.dietNote,
      ...items.map(({ note }) => note),
      // What staff wrote about a change of what is in the cake, and how the customer was told.
      ...changes.flatMap(({ acknowledgedNote, toldHow }) => [acknowledgedNote, toldHow]),
      // What was talked over with the customer, and why the owner took the order all the same.
      ...talks.map(({ text }) => text),
      ...lifted.map(({ reason }) => reason),
    ].filter((note) => note !== ''),
  };
}
