import type {
  Cake,
  Coating,
  CuttingCake,
  Design,
  Look,
  Sheet,
  Tier,
} from '#shared/contracts/design.ts';
import {
  coveringId,
  dietId,
  finishId,
  portionSizeId,
  styleId,
} from '#shared/contracts/vocabulary.ts';
import { DeclaredAllergy } from '#api/db/models/declared-allergy.ts';
import { DeclaredDiet } from '#api/db/models/declared-diet.ts';
import { ItemColour } from '#api/db/models/item-colour.ts';
import { ItemDecoration } from '#api/db/models/item-decoration.ts';
import { ItemTier } from '#api/db/models/item-tier.ts';
import { OrderItem } from '#api/db/models/order-item.ts';
import { OrderRevision } from '#api/db/models/order-revision.ts';

/** Divides several lines of words on one tier; a line holds no line break. */
export const wordsDivider = '\n';

/** Everything a design is read back from. */
const parts = [
  {
    model: OrderItem,
    as: 'items',
    include: [
      { model: ItemTier, as: 'tiers', separate: true },
      { model: ItemDecoration, as: 'decorations', separate: true },
      { model: ItemColour, as: 'colours', separate: true },
    ],
  },
  { model: DeclaredAllergy, as: 'allergies' },
  { model: DeclaredDiet, as: 'diets' },
];

/** Revisions with all their parts, by id. */
export async function loadRevisions(ids: readonly string[]): Promise<Map<string, OrderRevision>> {
  if (ids.length === 0) return new Map();
  // Apart from one another: joined, their rows would multiply.
  const revisions = await OrderRevision.findAll({
    where: { id: [...ids] },
    include: parts.map((part) => ({ ...part, separate: true })),
  });
  return new Map(revisions.map((revision) => [revision.id, revision]));
}

/** A revision with all its parts. @throws when there is none */
export async function loadRevision(id: string): Promise<OrderRevision> {
  const revision = (await loadRevisions([id])).get(id);
  if (revision === undefined) throw new Error(`There is no revision ${id}.`);
  return revision;
}

/** The design a revision holds, as it is priced, advised on and planned. */
export function designOf(revision: OrderRevision): Design {
  const items = inOrder(revision.items ?? []);
  const cakeItem = items.find((item) => item.kind === 'tiered' || item.kind === 'sheet');
  return {
    guests: {
      headCount: revision.headCount,
      occasionId: revision.occasionId,
      otherDesserts: revision.otherDesserts,
      portionSizeId: portionSizeId.parse(revision.portionSizeId),
      allergies: inOrder(revision.allergies ?? [])
        .filter((it) => it.erasedAt === null)
        .map(({ allergen, species, freeText, severity, guests }) => ({
          allergen,
          species,
          text: freeText,
          severity,
          guests,
        })),
      diets: (revision.diets ?? []).map(({ diet }) => dietId.parse(diet)),
      dietNote: revision.dietNote,
      infants: revision.infants,
      susceptible: revision.susceptibleGuests,
    },
    cake:
      cakeItem === undefined
        ? null
        : cakeOf(
            cakeItem,
            items.filter((item) => item.kind === 'cutting'),
          ),
    setting: {
      place: revision.settingPlace,
      warmestC: revision.settingWarmestC,
      minutesOut: revision.settingMinutesOut,
      driveMinutes: revision.settingDriveMinutes,
      servedAt: revision.settingServedMinute,
    },
    look: cakeItem === undefined ? null : lookOf(cakeItem, revision.note),
    extras: items.flatMap((item) =>
      item.extraId === null ? [] : [{ extraId: item.extraId, quantity: item.quantity }],
    ),
  };
}

function cakeOf(item: OrderItem, cutting: readonly OrderItem[]): Cake {
  const rows = inOrder(item.tiers ?? []);
  const [first] = rows;
  // Where every tier has a coat of its own, any of them stands for the cake's.
  const shared = rows.find((row) => !row.ownCoating) ?? first;
  const coating = shared === undefined ? null : coatingOf(shared);
  const cuttingCakes = cutting.map(cuttingCakeOf);
  if (item.kind === 'sheet') {
    return {
      kind: 'sheet',
      tiers: [],
      sheet: sheetOf(item),
      coating,
      cuttingCakes,
    };
  }
  return { kind: 'tiered', tiers: rows.map(tierOf), sheet: null, coating, cuttingCakes };
}

function sheetOf(item: OrderItem): Sheet {
  const [first] = inOrder(item.tiers ?? []);
  return {
    sizeId: item.sheetSizeId ?? '',
    layers: first?.layers ?? 1,
    spongeId: first?.spongeId ?? null,
    fillingId: first?.fillingId ?? null,
  };
}

function cuttingCakeOf(item: OrderItem): CuttingCake {
  return { ...sheetOf(item), count: item.quantity };
}

function tierOf(row: ItemTier): Tier {
  const { shape, widthMm, depthMm, heightMm, layers, real, keepsake, spongeId, fillingId } = row;
  return {
    shape,
    widthMm,
    depthMm,
    heightMm,
    layers,
    real,
    keepsake,
    spongeId,
    fillingId,
    coating: row.ownCoating ? coatingOf(row) : null,
  };
}

function coatingOf(row: ItemTier): Coating | null {
  if (row.coveringId === null || row.finishId === null) return null;
  return {
    covering: coveringId.parse(row.coveringId),
    style: row.styleId === null ? null : styleId.parse(row.styleId),
    finish: finishId.parse(row.finishId),
    colour: row.colourHex,
  };
}

function lookOf(item: OrderItem, note: string): Look {
  return {
    palette: inOrder(item.colours ?? []).map(({ hex }) => hex),
    words: inOrder(item.tiers ?? []).flatMap(({ words, position }) =>
      words === null ? [] : words.split(wordsDivider).map((text) => ({ tier: position, text })),
    ),
    decorations: inOrder(item.decorations ?? []).map(
      ({ decorationId, tierPosition, quantity, colourHex, source }) => ({
        decorationId,
        tier: tierPosition,
        quantity,
        colour: colourHex,
        source,
      }),
    ),
    note,
  };
}

function inOrder<T extends { readonly position: number }>(rows: readonly T[]): T[] {
  return rows.toSorted((a, b) => a.position - b.position);
}
