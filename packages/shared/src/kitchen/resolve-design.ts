import type { Cake, Coating, Design, PlacedDecoration } from '#shared/contracts/design.ts';
import type {
  ButtercreamStyle,
  Covering,
  Decoration,
  ExtraItem,
  Filling,
  Menu,
  PortionSize,
  SheetSize,
  Sponge,
} from '#shared/contracts/menu.ts';
import type { CoveringId, FinishId, StyleId } from '#shared/contracts/vocabulary.ts';
import { portionSizeOf } from './portions.ts';
import { named } from './sentences.ts';
import { blockOfSheet, blocksOf, type Block } from './sizes.ts';
import { UnknownPart } from './unknown-part.ts';

type Path = readonly (string | number)[];

/** A coat with what the menu says about it. */
export type ResolvedCoating = {
  readonly covering: Covering;
  readonly style: ButtercreamStyle | null;
  readonly finish: FinishId;
  readonly colour: string | null;
};

/** A block with everything it is made of; null where it is not chosen or not there. */
export type ResolvedBody = {
  readonly block: Block;
  readonly layers: number;
  readonly real: boolean;
  readonly keepsake: boolean;
  readonly sponge: Sponge | null;
  readonly filling: Filling | null;
  readonly coating: ResolvedCoating | null;
};

/** A tier, or the sheet, by its place from the board up. */
export type ResolvedTier = ResolvedBody & { readonly index: number };

/** One kind of cutting cake, by its place in the design; the body is one of `count`. */
export type ResolvedCuttingCake = ResolvedBody & {
  readonly index: number;
  readonly count: number;
  readonly size: SheetSize;
};

export type ResolvedDecoration = {
  readonly placed: PlacedDecoration;
  readonly decoration: Decoration;
};

/** A design whose every name was found on the menu. */
export type ResolvedDesign = {
  readonly design: Design;
  readonly menu: Menu;
  readonly portionSize: PortionSize;
  readonly tiers: readonly ResolvedTier[];
  readonly cuttingCakes: readonly ResolvedCuttingCake[];
  readonly decorations: readonly ResolvedDecoration[];
  readonly extras: readonly { readonly extra: ExtraItem; readonly quantity: number }[];
};

/** Finds every part of a design on the menu. Throws `UnknownPart` at the first that is not there. */
export function resolveDesign(design: Design, menu: Menu): ResolvedDesign {
  const { occasionId } = design.guests;
  // An occasion that is not chosen yet changes nothing that is worked out here.
  if (occasionId !== '') find(menu.occasions, occasionId, ['guests', 'occasionId']);
  return {
    design,
    menu,
    portionSize: portionSizeOf(design.guests, menu),
    tiers: resolveTiers(design, menu),
    cuttingCakes: resolveCuttingCakes(design, menu),
    decorations: (design.look?.decorations ?? []).map((placed, index) => ({
      placed,
      decoration: find(menu.decorations, placed.decorationId, [
        'look',
        'decorations',
        index,
        'decorationId',
      ]),
    })),
    extras: design.extras.map((it, index) => ({
      extra: find(menu.extras, it.extraId, ['extras', index, 'extraId']),
      quantity: it.quantity,
    })),
  };
}

function resolveTiers({ cake }: Design, menu: Menu): ResolvedTier[] {
  if (cake === null) return [];
  const blocks = blocksOf(cake, menu);
  const whole = resolveCoating(cake.coating, menu, ['cake', 'coating']);
  if (cake.kind === 'sheet') {
    const { sheet } = cake;
    if (sheet === null) return [];
    return blocks.map((block, index) => ({
      index,
      block,
      layers: sheet.layers,
      real: true,
      keepsake: false,
      sponge: findOrNull(menu.sponges, sheet.spongeId, ['cake', 'sheet', 'spongeId']),
      filling: findOrNull(menu.fillings, sheet.fillingId, ['cake', 'sheet', 'fillingId']),
      coating: whole,
    }));
  }
  return cake.tiers.map((tier, index) => {
    const path = ['cake', 'tiers', index];
    const { shape, widthMm, depthMm, heightMm } = tier;
    return {
      index,
      block: { shape, widthMm, depthMm, heightMm },
      layers: tier.layers,
      real: tier.real,
      keepsake: tier.keepsake,
      sponge: tier.real ? findOrNull(menu.sponges, tier.spongeId, [...path, 'spongeId']) : null,
      filling: tier.real ? findOrNull(menu.fillings, tier.fillingId, [...path, 'fillingId']) : null,
      coating:
        tier.coating === null ? whole : resolveCoating(tier.coating, menu, [...path, 'coating']),
    };
  });
}

function resolveCuttingCakes({ cake }: Design, menu: Menu): ResolvedCuttingCake[] {
  if (cake === null || cake.cuttingCakes.length === 0) return [];
  const coating = resolveCoating(plainCoatOf(cake), menu, ['cake', 'coating']);
  return cake.cuttingCakes.map((it, index) => {
    const path = ['cake', 'cuttingCakes', index];
    const size = find(menu.sheetSizes, it.sizeId, [...path, 'sizeId']);
    return {
      index,
      count: it.count,
      size,
      block: blockOfSheet(size),
      layers: it.layers,
      real: true,
      keepsake: false,
      sponge: findOrNull(menu.sponges, it.spongeId, [...path, 'spongeId']),
      filling: findOrNull(menu.fillings, it.fillingId, [...path, 'fillingId']),
      coating,
    };
  });
}

/**
 * What a cutting cake wears: the buttercream of the cake on show, smooth and untinted; ganache
 * where that has no buttercream. Null while the cake has no coat.
 */
export function plainCoatOf(cake: Cake): Coating | null {
  const coating = wornCoat(cake);
  if (coating === null) return null;
  const plain = { finish: 'smooth', colour: null } as const;
  return coating.style === null
    ? { covering: 'ganache', style: null, ...plain }
    : { covering: 'buttercream', style: coating.style, ...plain };
}

/** The coat that is seen: where every tier has one of its own, nobody wears the cake's. */
export function wornCoat({ kind, tiers, coating }: Cake): Coating | null {
  const own = kind === 'tiered' && tiers.every((it) => it.coating !== null);
  return (own ? tiers[0]?.coating : null) ?? coating;
}

function resolveCoating(coating: Coating | null, menu: Menu, path: Path): ResolvedCoating | null {
  if (coating === null) return null;
  return {
    covering: find(menu.coverings, coating.covering, [...path, 'covering']),
    style: findOrNull(menu.styles, coating.style, [...path, 'style']),
    finish: coating.finish,
    colour: coating.colour,
  };
}

function find<Item extends { readonly id: string }>(
  items: readonly Item[],
  id: string,
  path: Path,
): Item {
  const item = items.find((it) => it.id === id);
  if (item === undefined) throw new UnknownPart(path, id);
  return item;
}

function findOrNull<Item extends { readonly id: string }>(
  items: readonly Item[],
  id: string | null,
  path: Path,
): Item | null {
  return id === null ? null : find(items, id, path);
}

/** "Swiss meringue buttercream", "Fondant over Swiss meringue", "Ganache". */
export function coatingName(coating: {
  readonly covering: { readonly id: CoveringId; readonly name: string };
  readonly style: { readonly id: StyleId; readonly name: string } | null;
}): string {
  const { covering, style } = coating;
  if (style === null) return covering.name;
  if (covering.id === 'fondant') return `${covering.name} over ${style.name}`;
  if (covering.id === 'semi-naked') return `${covering.name} ${style.name}`;
  return named(style.name, 'buttercream');
}
