import { createHash } from 'node:crypto';
import { Op } from 'sequelize';
import type { Menu, PolicyText } from '#shared/contracts/menu.ts';
import { portionSizeId } from '#shared/contracts/vocabulary.ts';
import type { PriceBookContent } from '#shared/contracts/prices.ts';
import { AllergyRule } from '#api/db/models/allergy-rule.ts';
import { Extra } from '#api/db/models/extra.ts';
import { Occasion } from '#api/db/models/occasion.ts';
import { PolicyVersion } from '#api/db/models/policy-version.ts';
import { PortionSize } from '#api/db/models/portion-size.ts';
import { PriceBookVersion } from '#api/db/models/price-book-version.ts';
import { SheetSize } from '#api/db/models/sheet-size.ts';
import { Studio } from '#api/db/models/studio.ts';
import { TierSize } from '#api/db/models/tier-size.ts';
import { kitchenBook } from '#shared/kitchen/kitchen-book.ts';
import type { KitchenBook } from '#shared/kitchen/kitchen-book.ts';
import { publicPriceBook } from '#shared/kitchen/price-book.ts';
import { localAt } from '#shared/dates/local-time.ts';
import { currentPantry } from '#api/modules/pantry/load-pantry.queries.ts';
import { cakePartsOf, handledAllergens, loadCakeRows } from './cake-parts.queries.ts';
import type { CakeParts, CakeRows, VersionOf } from './cake-parts.queries.ts';
import { kitchenOf } from '#api/db/kitchen-of.ts';
import { inOrder, offered } from '#api/db/offered.ts';
import { presentStudioCard } from './studio-card.ts';

/** Everything a menu is made of but the pantry, as it stands at an instant. */
export type MenuGround = {
  readonly rows: CakeRows;
  readonly prices: PriceBookContent;
  readonly studio: Studio;
  readonly rest: Omit<Menu, 'version' | 'studio' | keyof CakeParts>;
};

/** The menu as it stands at this instant. */
export async function loadMenu(now: Date): Promise<Menu> {
  const [ground, pantry] = await Promise.all([loadMenuGround(now), currentPantry()]);
  const content = menuContent(ground, kitchenBook(pantry));
  const hash = createHash('sha256').update(JSON.stringify(content)).digest('base64url');
  return { version: hash.slice(0, 16), ...content };
}

/** What a menu is made of; with what is not offered any more, where old orders are read. */
export async function loadMenuGround(now: Date, { archivedToo = false } = {}): Promise<MenuGround> {
  const which = archivedToo ? { order: inOrder } : offered;
  const [studio, book] = await Promise.all([
    Studio.findByPk(1, { rejectOnEmpty: true }),
    PriceBookVersion.findOne({
      where: { validFrom: { [Op.lte]: now } },
      order: [['n', 'DESC']],
      rejectOnEmpty: true,
    }),
  ]);
  const [rows, portionSizes, occasions, tierSizes, sheetSizes, extras, rules, policies] =
    await Promise.all([
      loadCakeRows({ archivedToo }),
      PortionSize.findAll(which),
      Occasion.findAll(which),
      TierSize.findAll(which),
      SheetSize.findAll(which),
      Extra.findAll(which),
      AllergyRule.findAll(),
      loadPolicies(now, studio.zone),
    ]);
  return {
    rows,
    prices: book.content,
    studio,
    rest: {
      portionSizes: portionSizes.map(({ id, name, widthMm, depthMm, blurb }) => ({
        id: portionSizeIdOf(id),
        name,
        widthMm,
        depthMm,
        blurb,
      })),
      occasions: occasions.map(({ id, name }) => ({ id, name })),
      tierSizes: tierSizes.map(({ shape, widthMm, depthMm, heightsMm }) => ({
        shape,
        widthMm,
        depthMm,
        heightsMm,
      })),
      sheetSizes: sheetSizes.map(({ id, name, widthMm, depthMm, heightMm }) => ({
        id,
        name,
        widthMm,
        depthMm,
        heightMm,
      })),
      extras: extras.map(({ id, name, blurb, taxCategory }) => ({
        id,
        name,
        blurb,
        taxCategory,
        priceMinor: book.content.extraPrices[id] ?? 0,
      })),
      priceBook: publicPriceBook(book.id, book.content),
      allergyRules: rules.map(({ allergen, severity, answer }) => ({ allergen, severity, answer })),
      policies,
      kitchen: kitchenOf(studio),
      wordsPer100Mm: studio.wordsPerDecimetre,
      maxPhotos: studio.maxPhotos,
    },
  };
}

/** A menu over a pantry; by other versions of its formulas than today's, where an order keeps them. */
export function menuContent(
  { rows, prices, studio, rest }: MenuGround,
  book: KitchenBook,
  versionOf?: VersionOf,
): Omit<Menu, 'version'> {
  const { portionSizes, occasions, tierSizes, sheetSizes, ...others } = rest;
  return {
    studio: presentStudioCard(studio, handledAllergens(rows, book)),
    portionSizes,
    occasions,
    tierSizes,
    sheetSizes,
    ...cakePartsOf(rows, book, prices, versionOf),
    ...others,
  };
}

/** The newest text of each kind that is in force. */
async function loadPolicies(now: Date, zone: string): Promise<PolicyText[]> {
  const versions = await PolicyVersion.findAll({
    where: { validFrom: { [Op.lte]: now } },
    order: [['n', 'ASC']],
  });
  const newest = new Map(versions.map((version) => [version.kind, version]));
  return [...newest.values()].map(({ id, kind, title, text, validFrom }) => ({
    kind,
    versionId: id,
    title,
    text,
    since: localAt(validFrom, zone).date,
  }));
}

function portionSizeIdOf(id: string): Menu['portionSizes'][number]['id'] {
  return portionSizeId.parse(id);
}
