import type { Cake, Coating, Design, Sheet } from '#shared/contracts/design.ts';
import type { Estimate } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { plainCoatOf } from '#shared/kitchen/resolve-design.ts';
import { blockOfSheet } from '#shared/kitchen/sizes.ts';
import { ButtercreamStyle } from '#api/db/models/buttercream-style.ts';
import { Covering } from '#api/db/models/covering.ts';
import { Decoration } from '#api/db/models/decoration.ts';
import { DeclaredAllergy } from '#api/db/models/declared-allergy.ts';
import { DeclaredDiet } from '#api/db/models/declared-diet.ts';
import { Filling } from '#api/db/models/filling.ts';
import { Formula } from '#api/db/models/formula.ts';
import { ItemColour } from '#api/db/models/item-colour.ts';
import { ItemDecoration } from '#api/db/models/item-decoration.ts';
import { ItemTier } from '#api/db/models/item-tier.ts';
import { OrderItem } from '#api/db/models/order-item.ts';
import { OrderRevision } from '#api/db/models/order-revision.ts';
import { RevisionFormulaVersion } from '#api/db/models/revision-formula-version.ts';
import { RevisionPolicyVersion } from '#api/db/models/revision-policy-version.ts';
import { Sponge } from '#api/db/models/sponge.ts';
import { wordsDivider } from './order-design.queries.ts';

export type NewRevision = {
  readonly orderId: string;
  readonly n: number;
  readonly design: Design;
  readonly estimate: Estimate;
  readonly pickup: { readonly date: string; readonly start: number; readonly minutes: number };
  readonly menu: Menu;
  readonly workTimeVersionId: string;
  readonly createdByRole: OrderRevision['createdByRole'];
  readonly createdByUserId: string | null;
};

/**
 * Writes what is asked for, with the versions it was worked out with; in a transaction.
 * @returns the ids that planned work points at
 */
export async function writeRevision(
  revision: NewRevision,
): Promise<{ revisionId: string; cakeItemId: string | null }> {
  const { design, estimate, pickup, menu } = revision;
  const { guests, setting } = design;
  if (setting === null) throw new Error('A revision needs a setting.');
  const { id: revisionId } = await OrderRevision.create({
    orderId: revision.orderId,
    n: revision.n,
    headCount: guests.headCount,
    occasionId: guests.occasionId,
    otherDesserts: guests.otherDesserts,
    portionSizeId: guests.portionSizeId,
    infants: guests.infants,
    susceptibleGuests: guests.susceptible,
    dietNote: guests.dietNote,
    pickupDate: pickup.date,
    windowStartMinute: pickup.start,
    windowMinutes: pickup.minutes,
    settingPlace: setting.place,
    settingWarmestC: setting.warmestC,
    settingMinutesOut: setting.minutesOut,
    settingDriveMinutes: setting.driveMinutes,
    settingServedMinute: setting.servedAt,
    note: design.look?.note ?? '',
    estimate,
    priceBookVersionId: menu.priceBook.versionId,
    workTimeVersionId: revision.workTimeVersionId,
    totalMinor: estimate.price.totalMinor,
    currency: estimate.price.currency,
    createdByRole: revision.createdByRole,
    createdByUserId: revision.createdByUserId,
  });
  const cakeItemId = await writeCake(revisionId, design, menu);
  const cuttingCakes = design.cake?.cuttingCakes ?? [];
  if (design.cake !== null) await writeCuttingCakes(revisionId, design.cake, menu);
  await OrderItem.bulkCreate(
    design.extras.map(({ extraId, quantity }, index) => ({
      revisionId,
      position: index + 1 + cuttingCakes.length,
      kind: 'extra' as const,
      quantity,
      extraId,
    })),
  );
  await DeclaredAllergy.bulkCreate(
    guests.allergies.map(({ text, ...declared }, position) => ({
      ...declared,
      revisionId,
      position,
      freeText: text,
    })),
  );
  await DeclaredDiet.bulkCreate([...new Set(guests.diets)].map((diet) => ({ revisionId, diet })));
  await RevisionPolicyVersion.bulkCreate(
    menu.policies.map(({ versionId }) => ({ revisionId, policyVersionId: versionId })),
  );
  const formulaVersionIds = await formulaVersionsOf(design);
  await RevisionFormulaVersion.bulkCreate(
    formulaVersionIds.map((formulaVersionId) => ({ revisionId, formulaVersionId })),
  );
  return { revisionId, cakeItemId };
}

async function writeCake(revisionId: string, design: Design, menu: Menu): Promise<string | null> {
  const { cake, look } = design;
  if (cake === null) return null;
  const { id: itemId } = await OrderItem.create({
    revisionId,
    position: 0,
    kind: cake.kind,
    sheetSizeId: cake.kind === 'sheet' ? (cake.sheet?.sizeId ?? null) : null,
  });
  const words = (tier: number) => {
    const lines = (look?.words ?? []).filter((it) => it.tier === tier && it.text !== '');
    return lines.length === 0 ? null : lines.map((it) => it.text).join(wordsDivider);
  };
  await ItemTier.bulkCreate(
    tiersOf(cake, menu).map((tier, position) => ({
      ...tier,
      itemId,
      position,
      words: words(position),
    })),
  );
  await ItemDecoration.bulkCreate(
    (look?.decorations ?? []).map(({ decorationId, tier, quantity, colour, source }, position) => ({
      itemId,
      position,
      decorationId,
      tierPosition: tier,
      quantity,
      colourHex: colour,
      source,
    })),
  );
  await ItemColour.bulkCreate(
    (look?.palette ?? []).map((hex, position) => ({ itemId, position, hex })),
  );
  return itemId;
}

/** Each kind of cutting cake is an item of its own, right after the cake, with one body. */
async function writeCuttingCakes(revisionId: string, cake: Cake, menu: Menu): Promise<void> {
  const coat = plainCoatOf(cake);
  for (const [index, it] of cake.cuttingCakes.entries()) {
    const { id: itemId } = await OrderItem.create({
      revisionId,
      position: index + 1,
      kind: 'cutting',
      quantity: it.count,
      sheetSizeId: it.sizeId,
    });
    await ItemTier.bulkCreate(
      bodiesOfSheet(it, menu).map((body) => ({
        ...body,
        ...coatingColumns(coat),
        itemId,
        position: 0,
      })),
    );
  }
}

/** A sheet is kept as one tier of its size; the cake's coat is written on every tier. */
function tiersOf(cake: Cake, menu: Menu) {
  if (cake.kind === 'tiered') {
    return cake.tiers.map(({ coating, ...tier }) => ({
      ...tier,
      ...coatingColumns(coating ?? cake.coating),
      ownCoating: coating !== null,
    }));
  }
  return bodiesOfSheet(cake.sheet, menu).map((body) => ({
    ...body,
    ...coatingColumns(cake.coating),
    ownCoating: false,
  }));
}

function bodiesOfSheet(sheet: Sheet | null, menu: Menu) {
  const size = menu.sheetSizes.find(({ id }) => id === sheet?.sizeId);
  if (sheet === null || size === undefined) return [];
  const { layers, spongeId, fillingId } = sheet;
  return [{ ...blockOfSheet(size), layers, real: true, keepsake: false, spongeId, fillingId }];
}

function coatingColumns(coating: Coating | null) {
  return {
    coveringId: coating?.covering ?? null,
    styleId: coating?.style ?? null,
    finishId: coating?.finish ?? null,
    colourHex: coating?.colour ?? null,
  };
}

/** Current versions of the formulas a design names; those inside them are named by their lines. */
async function formulaVersionsOf(design: Design): Promise<string[]> {
  const { cake, look } = design;
  if (cake === null) return [];
  const chosen = (
    pick: (it: { spongeId: string | null; fillingId: string | null }) => string | null,
  ) =>
    [...cake.tiers, ...(cake.sheet === null ? [] : [cake.sheet]), ...cake.cuttingCakes].flatMap(
      (it) => pick(it) ?? [],
    );
  const coats = [
    cake.coating,
    ...cake.tiers.map((tier) => tier.coating),
    ...(cake.cuttingCakes.length === 0 ? [] : [plainCoatOf(cake)]),
  ].filter((it) => it !== null);
  const rows = await Promise.all([
    Sponge.findAll({ where: { id: chosen((it) => it.spongeId) } }),
    Filling.findAll({ where: { id: chosen((it) => it.fillingId) } }),
    ButtercreamStyle.findAll({ where: { id: coats.flatMap((it) => it.style ?? []) } }),
    Covering.findAll({ where: { id: coats.map((it) => it.covering) } }),
    Decoration.findAll({
      where: { id: (look?.decorations ?? []).map((it) => it.decorationId) },
    }),
  ]);
  const formulaIds = rows.flat().flatMap(({ formulaId }) => formulaId ?? []);
  const formulas = await Formula.findAll({ where: { id: formulaIds } });
  return formulas.flatMap(({ currentVersionId }) => currentVersionId ?? []);
}
