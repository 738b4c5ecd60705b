import { isDeepStrictEqual } from 'node:util';
import type { PriceBookContent, SavePrices } from '#shared/contracts/prices.ts';
import { PriceBookVersion } from '#api/db/models/price-book-version.ts';
import { Studio } from '#api/db/models/studio.ts';
import { noteCatalogueChange } from '#api/db/plan-versions.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import type { Staff } from '#api/platform/actor.ts';
import { AppError, invalidField, type Issue } from '#api/platform/app-error.ts';
import {
  findNewestBook,
  findPriceable,
  isCurrencyFixed,
  type Priceable,
} from './prices.queries.ts';

/**
 * Makes the next version of the price book; the menu and every estimate go by it at once, while
 * offers and agreed quotes keep theirs. A book that says the same as before makes no version.
 * @throws `changed-meanwhile` when the book is no longer the one this was made from,
 *   `invalid-input` for a currency that may not change and for things that are not on the menu
 */
export async function savePrices(
  { clock }: Pick<Deps, 'clock'>,
  actor: Staff,
  { madeFrom, content }: SavePrices,
): Promise<void> {
  const strange = strangersIn(content, await findPriceable());
  if (strange.length > 0) throw new AppError('invalid-input', { issues: strange });
  await inTransaction(async () => {
    const newest = await findNewestBook();
    if (newest.n !== madeFrom) throw new AppError('changed-meanwhile', { facts: { n: newest.n } });
    if (isDeepStrictEqual(newest.content, content)) return;
    if (newest.content.currency !== content.currency) await changeCurrency(content.currency);
    const next = await PriceBookVersion.create({
      n: newest.n + 1,
      content,
      validFrom: clock.now(),
      createdByUserId: actor.userId,
    });
    await noteCatalogueChange();
    await noteAudit(actor, {
      action: 'save-prices',
      subjectKind: 'price-book-version',
      subjectId: next.id,
      data: { n: next.n, before: newest.n },
    });
  });
}

/** The studio speaks in one currency; amounts stay the figures they are. */
async function changeCurrency(currency: string): Promise<void> {
  const path = ['content', 'currency'];
  if (await isCurrencyFixed()) {
    throw invalidField(path, 'The currency stays as it is since the first order.');
  }
  if (!Intl.supportedValuesOf('currency').includes(currency)) {
    throw invalidField(path, `${currency} is no currency of ISO 4217.`);
  }
  await Studio.update({ currency }, { where: { id: 1 } });
}

/** Prices of things the studio does not have, each an issue at its place. */
function strangersIn(content: PriceBookContent, priceable: Priceable): Issue[] {
  const places = [
    ['spongeSurcharges', priceable.sponges],
    ['fillingSurcharges', priceable.fillings],
    ['styleSurcharges', priceable.styles],
    ['coveringSurcharges', priceable.coverings],
    ['decorationPrices', priceable.decorations],
    ['extraPrices', priceable.extras],
  ] as const;
  return places.flatMap(([field, things]) => {
    const known = new Set<string>(things.map(({ id }) => id));
    return Object.keys(content[field])
      .filter((id) => !known.has(id))
      .map((id) => ({
        path: ['content', field, id],
        message: `There is no “${id}” on the menu any more.`,
      }));
  });
}
