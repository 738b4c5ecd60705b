import { col, fn } from 'sequelize';
import { ButtercreamStyle } from '#api/db/models/buttercream-style.ts';
import { Covering } from '#api/db/models/covering.ts';
import { Decoration } from '#api/db/models/decoration.ts';
import { Extra } from '#api/db/models/extra.ts';
import { Filling } from '#api/db/models/filling.ts';
import { OrderRevision } from '#api/db/models/order-revision.ts';
import { Order } from '#api/db/models/order.ts';
import { PriceBookVersion } from '#api/db/models/price-book-version.ts';
import { Sponge } from '#api/db/models/sponge.ts';
import { User } from '#api/db/models/user.ts';
import { offered } from '#api/db/offered.ts';

/** What can have a price, as it is offered now. */
export type Priceable = {
  readonly sponges: readonly Sponge[];
  readonly fillings: readonly Filling[];
  readonly styles: readonly ButtercreamStyle[];
  readonly coverings: readonly Covering[];
  readonly decorations: readonly Decoration[];
  readonly extras: readonly Extra[];
};

export async function findPriceable(): Promise<Priceable> {
  const [sponges, fillings, styles, coverings, decorations, extras] = await Promise.all([
    Sponge.findAll(offered),
    Filling.findAll(offered),
    ButtercreamStyle.findAll(offered),
    Covering.findAll(offered),
    Decoration.findAll(offered),
    Extra.findAll(offered),
  ]);
  return { sponges, fillings, styles, coverings, decorations, extras };
}

/** The newest book; there has been one since the studio was set up. */
export function findNewestBook(): Promise<PriceBookVersion> {
  return PriceBookVersion.findOne({ order: [['n', 'DESC']], rejectOnEmpty: true });
}

/** The currency stays once money has been spoken of with a customer. */
export async function isCurrencyFixed(): Promise<boolean> {
  return (await Order.count()) > 0;
}

export type PriceBookRecord = {
  readonly n: number;
  readonly validFrom: Date;
  readonly by: string | null;
  readonly orders: number;
};

/** Every book there was, newest first, with who saved it and how many orders stand by it. */
export async function listBooks(): Promise<PriceBookRecord[]> {
  const [versions, users, revisions] = await Promise.all([
    PriceBookVersion.findAll({ order: [['n', 'DESC']] }),
    User.findAll({ attributes: ['id', 'name'] }),
    OrderRevision.findAll({
      attributes: ['priceBookVersionId', [fn('count', fn('distinct', col('order_id'))), 'n']],
      group: ['priceBookVersionId'],
    }),
  ]);
  const names = new Map(users.map((it) => [it.id, it.name]));
  const counts = new Map(revisions.map((it) => [it.priceBookVersionId, Number(it.get('n'))]));
  return versions.map((it) => ({
    n: it.n,
    validFrom: it.validFrom,
    by: it.createdByUserId === null ? null : (names.get(it.createdByUserId) ?? null),
    orders: counts.get(it.id) ?? 0,
  }));
}
