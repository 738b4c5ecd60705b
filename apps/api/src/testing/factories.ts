import type { CreationAttributes } from 'sequelize';
import type { Estimate } from '#shared/contracts/estimates.ts';
import { currentClock } from '#api/db/current-database.ts';
import type { PriceBookContent } from '#shared/contracts/prices.ts';
import { Occasion } from '#api/db/models/occasion.ts';
import { Order } from '#api/db/models/order.ts';
import { OrderContact } from '#api/db/models/order-contact.ts';
import { OrderRevision } from '#api/db/models/order-revision.ts';
import { PortionSize } from '#api/db/models/portion-size.ts';
import { PriceBookVersion } from '#api/db/models/price-book-version.ts';
import { User } from '#api/db/models/user.ts';
import { WorkTimeVersion } from '#api/db/models/work-time-version.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { newId, newOrderCode } from '#api/platform/ids.ts';

/** An estimate of nothing in particular, for rows that need one. */
export const emptyEstimate: Estimate = {
  portions: { wanted: 20, fed: 20, perTier: [20], perCuttingCake: [] },
  proposals: [],
  price: {
    currency: 'USD',
    priceBookVersionId: 'none',
    lines: [],
    subtotalMinor: 12_000,
    taxMinor: 0,
    taxInclusive: false,
    totalMinor: 12_000,
    depositMinor: 0,
  },
  allergens: [],
  handled: [],
  ranks: [],
  advice: [],
  weightG: 0,
  pieces: [],
  amounts: { spongeG: 0, fillingG: 0, frostingG: 0, coveringG: 0 },
  heightMm: 0,
  keepCool: '',
};

const emptyPriceBook: PriceBookContent = {
  currency: 'USD',
  tierBands: [],
  sheetPerPortionMinor: 0,
  dummyTierMinor: 0,
  finishes: [],
  wordsMinor: 0,
  minimumMinor: 0,
  rush: [],
  taxInclusive: false,
  taxes: [],
  roundToMinor: 1,
  depositPpm: 0,
  depositFloorMinor: 0,
  balanceDueDays: 0,
  spongeSurcharges: {},
  fillingSurcharges: {},
  styleSurcharges: {},
  coveringSurcharges: {},
  decorationPrices: {},
  decoratingPerHourMinor: 0,
  materialsMarkupPpm: 0,
  extraPrices: {},
  labourPerHourMinor: 0,
  overheadPpm: 0,
  targetMarginPpm: 250_000,
  packaging: [],
};

/** An account with a proven address. */
export function makeUser(values: Partial<CreationAttributes<User>> = {}): Promise<User> {
  return inTransaction(() =>
    User.create({
      email: `${newId()}@example.com`,
      name: 'Ada Tarn',
      role: 'customer',
      emailProvenAt: currentClock().now(),
      ...values,
    }),
  );
}

/** What an order must point at, where the database is not seeded. */
async function ensureGround(): Promise<{
  occasionId: string;
  portionSizeId: string;
  priceBookVersionId: string;
  workTimeVersionId: string;
}> {
  const validFrom = currentClock().now();
  const occasion =
    (await Occasion.findOne()) ?? (await Occasion.create({ id: 'birthday', name: 'Birthday' }));
  const portion =
    (await PortionSize.findOne()) ??
    (await PortionSize.create({ id: 'dessert', name: 'Dessert', widthMm: 25, depthMm: 50 }));
  const prices =
    (await PriceBookVersion.findOne({ order: [['n', 'DESC']] })) ??
    (await PriceBookVersion.create({ n: 1, content: emptyPriceBook, validFrom }));
  const times =
    (await WorkTimeVersion.findOne({ order: [['n', 'DESC']] })) ??
    (await WorkTimeVersion.create({ n: 1, content: {}, validFrom }));
  return {
    occasionId: occasion.id,
    portionSizeId: portion.id,
    priceBookVersionId: prices.id,
    workTimeVersionId: times.id,
  };
}

export type MadeOrder = {
  readonly order?: Partial<CreationAttributes<Order>>;
  readonly revision?: Partial<CreationAttributes<OrderRevision>>;
  readonly contact?: Partial<CreationAttributes<OrderContact>>;
};

/**
 * An order with one revision and who ordered it; no items, no plan. By default one just asked for,
 * to be collected on Saturday 6 June 2026 at ten in New York.
 */
export function makeOrder({ order, revision, contact }: MadeOrder = {}): Promise<Order> {
  return inTransaction(async () => {
    const { occasionId, ...ground } = await ensureGround();
    const highest = await Order.max<number | null, Order>('number');
    const made = await Order.create({
      number: (highest ?? 2400) + 1,
      code: newOrderCode(),
      status: 'asked',
      occasionId,
      currency: 'USD',
      terms: { depositMinor: 0, balanceDueDays: 0, handoverWithBalance: false },
      pickupDate: '2026-06-06',
      windowStartMinute: 600,
      windowMinutes: 60,
      zone: 'America/New_York',
      pickupAt: new Date('2026-06-06T14:00:00Z'),
      dateAnswer: 'open',
      ...order,
    });
    const asked = await OrderRevision.create({
      orderId: made.id,
      n: 1,
      headCount: 20,
      occasionId,
      ...ground,
      pickupDate: made.pickupDate,
      windowStartMinute: made.windowStartMinute,
      windowMinutes: made.windowMinutes,
      settingPlace: 'indoors',
      settingWarmestC: 22,
      settingMinutesOut: 60,
      settingDriveMinutes: 15,
      estimate: emptyEstimate,
      totalMinor: emptyEstimate.price.totalMinor,
      currency: 'USD',
      createdByRole: 'guest',
      ...revision,
    });
    await OrderContact.create({
      orderId: made.id,
      role: 'ordered',
      name: 'Ada Tarn',
      email: 'ada@example.com',
      ...contact,
    });
    return made.update({ currentRevisionId: asked.id });
  });
}
