import type { Advice, Estimate } from '#shared/contracts/estimates.ts';
import type { AllergenEntry, Menu } from '#shared/contracts/menu.ts';
import type { Design } from '#shared/contracts/design.ts';
import { isAboutGuests } from '#shared/kitchen/about-guests.ts';
import { allergenLabel } from '#shared/kitchen/allergen-names.ts';
import { chosenRows } from '#shared/kitchen/chosen-words.ts';
import { coatColour } from '#shared/kitchen/coat-colour.ts';
import { sheetSizeOf } from '#shared/kitchen/sizes.ts';
import { Occasion } from '#api/db/models/occasion.ts';
import { Order } from '#api/db/models/order.ts';
import type { DrawnTier } from '#api/mail/content.ts';
import type { House } from '#api/mail/house.ts';
import type { MailOrder, MailPickup } from '#api/mail/mail-data.ts';
import type { Deps } from '#api/modules/deps.ts';
import { designOf } from '#api/modules/orders/order-design.queries.ts';
import { menuOfAllTimes, summariseRevision } from '#api/modules/orders/order-summary.queries.ts';
import { loadOrderRecord } from '#api/modules/orders/orders.queries.ts';
import type { OrderRecord } from '#api/modules/orders/orders.queries.ts';
import { privateKeyOf, privateLink } from '#api/platform/private-link.ts';
import { loadHouse } from './house.queries.ts';

/** An order as both sides are told of it. */
export type ToldOrder = {
  readonly house: House;
  readonly record: OrderRecord;
  /** Where the customer's mail goes; null where no address is known (any more). */
  readonly email: string | null;
  readonly forCustomer: MailOrder;
  readonly forStaff: MailOrder;
};

export async function loadToldOrder(deps: Pick<Deps, 'env'>, orderId: string): Promise<ToldOrder> {
  const order = await Order.findByPk(orderId, { rejectOnEmpty: true });
  const [house, record, menu, occasion] = await Promise.all([
    loadHouse(deps),
    loadOrderRecord(order),
    menuOfAllTimes(),
    Occasion.findByPk(order.occasionId, { rejectOnEmpty: true }),
  ]);
  const { revision, contacts, agreedPrice, estimate } = record;
  const { sessionSecret, publicUrl } = deps.env;
  const ordered = contacts.find(({ role }) => role === 'ordered');
  const told: MailOrder = {
    number: order.number,
    link: privateLink(publicUrl, order.code, privateKeyOf(sessionSecret, order)),
    name: ordered?.name ?? '',
    collector: contacts.find(({ role }) => role === 'collects')?.name ?? null,
    pickup: mailPickupOf(order),
    occasion: occasion.name,
    headCount: revision.headCount,
    summary: summariseRevision(revision, menu),
    chosen: chosenRows(designOf(revision), menu),
    tiers: tiersOf(designOf(revision), menu),
    price: agreedPrice ?? estimate.price,
    ...contentsOf(estimate, house),
    keepCool: estimate.keepCool,
    beforeEating: takenOut(estimate),
    weightG: estimate.weightG,
    heightMm: estimate.heightMm,
  };
  return {
    house,
    record,
    email: ordered?.email ?? null,
    forCustomer: told,
    forStaff: { ...told, link: `${publicUrl}/staff/orders/${order.number}` },
  };
}

/** The pickup an order has, as a mail tells it; null while it has no day. */
export function mailPickupOf({
  pickupDate,
  windowStartMinute,
  windowMinutes,
}: Order): MailPickup | null {
  if (pickupDate === null || windowStartMinute === null || windowMinutes === null) return null;
  return { date: pickupDate, start: windowStartMinute, minutes: windowMinutes };
}

/** The cake from the side, lowest first; a sheet shows its long side. */
function tiersOf({ cake }: Design, menu: Menu): DrawnTier[] {
  if (cake === null) return [];
  const colourOf = (coat: typeof cake.coating): string =>
    coat === null ? '#ffffff' : coatColour(menu, coat);
  if (cake.sheet !== null) {
    const { widthMm, depthMm, heightMm } = sheetSizeOf(cake.sheet, menu);
    const colour = colourOf(cake.coating);
    return [{ widthMm: Math.max(widthMm, depthMm), heightMm, colour }];
  }
  return cake.tiers.map(({ widthMm, heightMm, coating }) => ({
    widthMm,
    heightMm,
    colour: colourOf(coating ?? cake.coating),
  }));
}

function contentsOf(
  { allergens, handled }: Estimate,
  { studio }: House,
): Pick<MailOrder, 'contains' | 'mayContain' | 'handled'> {
  const named = (entries: readonly AllergenEntry[]): string[] =>
    entries.map((entry) => allergenLabel(entry, studio.labelRegion));
  const contains = named(allergens.filter(({ state }) => state === 'contains'));
  return {
    contains,
    // What nobody knows yet is told as a maybe, never left out.
    mayContain: named(
      allergens.filter(({ state }) => state === 'may-contain' || state === 'unknown'),
    ),
    handled: named(handled).filter((name) => !contains.includes(name)),
  };
}

/** The advice of a level that a mail may tell, each in its sentences. */
export function adviceToTell({ advice }: Estimate, level: Advice['level']): string[] {
  return advice
    .filter((it) => it.level === level && !isAboutGuests(it))
    .map(({ sentence, instead }) => `${sentence} ${instead}`.trim());
}

/** What comes out or off, and what those at the table want to know: alcohol, as a flavor too. */
const toldBeforeEating: ReadonlySet<Advice['code']> = new Set([
  'supports',
  'alcohol',
  'inedible',
  'small-parts',
  'flowers',
]);

function takenOut({ advice }: Estimate): string[] {
  return advice
    .filter((it) => toldBeforeEating.has(it.code))
    .map(({ sentence, instead }) => `${sentence} ${instead}`.trim());
}

/** Whether there is advice about the guests, which stays on the order's page. */
export function hasGuestAdvice({ advice }: Estimate): boolean {
  return advice.some((it) => it.level !== 'ok' && isAboutGuests(it));
}
