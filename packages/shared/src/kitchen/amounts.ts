import { boardOf, areaMm2, doubleHeightMm, ledgesOf, perimeterMm, volumeMl } from './sizes.ts';
import type { ResolvedDesign, ResolvedTier } from './resolve-design.ts';

/**
 * The studio's defaults. Thicknesses and the tenth for bowl and bag are from the kitchen's
 * definition; bead, dam and board figures are from trade memory, without a source.
 */
export const amountRules = {
  crumbCoatMm: 2,
  finalCoatMm: 4,
  /** The one coat that lies under fondant. */
  underFondantMm: 3,
  /** What stays in bowl and bag: 10 %. */
  bowlAndBagPpm: 100_000,
  /** Width of the ring of frosting that holds a soft filling. */
  damMm: 10,
  /** Bead at the foot of a smooth or textured tier, and of the borders of a piped one. */
  footBeadMm: 8,
  pipedBeadMm: 12,
  boardGPerMl: 0.4,
  cardThicknessMm: 3,
  cardGPerMl: 0.6,
  dummyGPerMl: 0.03,
} as const;

/** Grams of one tier: what goes into it, and what of that is carried. */
export type TierAmounts = {
  readonly spongeG: number;
  readonly fillingG: number;
  /** Buttercream, bowl and bag included. */
  readonly frostingG: number;
  /** Fondant or ganache, bowl and bag included for ganache. */
  readonly coveringG: number;
  readonly carriedG: number;
};

export type CakeAmounts = Omit<TierAmounts, 'carriedG'> & {
  readonly perTier: readonly TierAmounts[];
};

/**
 * Batter for a finished sponge: what baking and levelling take away is added back.
 * Losses in parts per million.
 */
export function batterG(
  spongeG: number,
  losses: { readonly bakeLossPpm: number; readonly levellingPpm: number },
): number {
  return spongeG / (1 - losses.levellingPpm / 1e6) / (1 - losses.bakeLossPpm / 1e6);
}

/** Millilitres of coat over sides and visible top, at a thickness. */
function coatMl(tier: ResolvedTier, visibleTopMm2: number, thicknessMm: number): number {
  const sideMm2 = perimeterMm(tier.block) * tier.block.heightMm;
  return ((sideMm2 + visibleTopMm2) * thicknessMm) / 1000;
}

/** Length times the bead's cross-section: a foot border, or foot and rim where it is piped. */
function borderMl(tier: ResolvedTier): number {
  const piped = tier.coating?.finish === 'piped';
  const bead = piped ? amountRules.pipedBeadMm : amountRules.footBeadMm;
  const lengthMm = perimeterMm(tier.block) * (piped ? 2 : 1);
  return (lengthMm * Math.PI * (bead / 2) ** 2) / 1000;
}

type Coats = { readonly frostingMl: number; readonly coveringMl: number };

function coatsOf(tier: ResolvedTier, visibleTopMm2: number): Coats {
  const { crumbCoatMm, finalCoatMm, underFondantMm } = amountRules;
  const coat = (thicknessMm: number) => coatMl(tier, visibleTopMm2, thicknessMm);
  if (tier.coating === null) return { frostingMl: 0, coveringMl: 0 };
  const { covering } = tier.coating;
  switch (covering.id) {
    case 'buttercream':
      return { frostingMl: coat(crumbCoatMm + finalCoatMm) + borderMl(tier), coveringMl: 0 };
    case 'semi-naked':
      return { frostingMl: coat(crumbCoatMm), coveringMl: 0 };
    case 'fondant':
      return { frostingMl: coat(underFondantMm), coveringMl: coat(covering.thicknessMm) };
    case 'ganache':
      return { frostingMl: 0, coveringMl: coat(covering.thicknessMm) };
  }
}

/** Grams of one tier, unrounded; `visibleTopMm2` is its whole top or the ledge left in sight. */
export function amountsOfTier(tier: ResolvedTier, visibleTopMm2: number): TierAmounts {
  const { block, sponge, filling, coating } = tier;
  const gaps = tier.real && filling !== null ? Math.max(0, tier.layers - 1) : 0;
  const thicknessMm = filling?.thicknessMm ?? 0;
  const gapMl = (gaps * areaMm2(block) * thicknessMm) / 1000;
  const damMl =
    filling?.soft === true && coating !== null
      ? Math.min(gapMl, (gaps * perimeterMm(block) * amountRules.damMm * thicknessMm) / 1000)
      : 0;
  const spongeG = Math.max(0, volumeMl(block) - gapMl) * (sponge?.densityGPerMl ?? 0);
  const fillingG = (gapMl - damMl) * (filling?.densityGPerMl ?? 0);

  const coats = coatsOf(tier, visibleTopMm2);
  // Ganache has no buttercream beside it, so it makes its own dam.
  const damOfCovering = coating !== null && coating.style === null;
  const frostingG =
    (coats.frostingMl + (damOfCovering ? 0 : damMl)) * (coating?.style?.densityGPerMl ?? 0);
  const coveringG =
    (coats.coveringMl + (damOfCovering ? damMl : 0)) * (coating?.covering.densityGPerMl ?? 0);
  const spare = 1 + amountRules.bowlAndBagPpm / 1e6;
  const dummyG = tier.real ? 0 : volumeMl(block) * amountRules.dummyGPerMl;
  return {
    spongeG,
    fillingG,
    frostingG: frostingG * spare,
    coveringG: coating?.covering.id === 'ganache' ? coveringG * spare : coveringG,
    carriedG: spongeG + fillingG + frostingG + coveringG + dummyG + cardsG(tier),
  };
}

/** The card under a tier, and the inner one of a tall tier; both are hidden and carried. */
function cardsG({ block }: ResolvedTier): number {
  const cards = block.heightMm > doubleHeightMm ? 2 : 1;
  const ml = (areaMm2(block) * amountRules.cardThicknessMm) / 1000;
  return cards * ml * amountRules.cardGPerMl;
}

/** Grams of the whole cake, unrounded, and of each tier from the board up. */
export function amountsOf(resolved: ResolvedDesign): CakeAmounts {
  const ledges = ledgesOf(resolved.tiers.map((it) => it.block));
  const perTier = resolved.tiers.map((tier, index) =>
    amountsOfTier(tier, ledges[index]?.areaMm2 ?? 0),
  );
  const sum = (kind: keyof TierAmounts) => perTier.reduce((total, it) => total + it[kind], 0);
  return {
    spongeG: sum('spongeG'),
    fillingG: sum('fillingG'),
    frostingG: sum('frostingG'),
    coveringG: sum('coveringG'),
    perTier,
  };
}

/** The whole cake as it is carried: tiers, cards, board and decorations; 0 before it exists. */
export function carriedWeightG(resolved: ResolvedDesign, amounts: CakeAmounts): number {
  const { design, menu, decorations } = resolved;
  if (design.cake === null || resolved.tiers.length === 0) return 0;
  const board = boardOf(design.cake, menu);
  const boardG = board === null ? 0 : volumeMl(board) * amountRules.boardGPerMl;
  const tiersG = amounts.perTier.reduce((sum, it) => sum + it.carriedG, 0);
  const decorationsG = decorations.reduce(
    (sum, it) => sum + it.decoration.weightG * it.placed.quantity,
    0,
  );
  return Math.round(tiersG + boardG + decorationsG);
}

/** How far above the cake a thing reaches that stands on top, mm (memory). */
const standsMm = {
  topper: 120,
  figure: 80,
  flower: 50,
  fruit: 40,
  leaf: 30,
  pearl: 0,
  border: 10,
  drip: 0,
  print: 0,
  ribbon: 0,
  sprinkle: 0,
} as const;

/** Millimetres from the table to the tip: board, tiers, what stands on top; 0 without a cake. */
export function heightMm(resolved: ResolvedDesign): number {
  const { design, menu, tiers } = resolved;
  const board = design.cake === null ? null : boardOf(design.cake, menu);
  if (board === null) return 0;
  const top = tiers.length - 1;
  const onTop = resolved.decorations
    .filter((it) => it.placed.tier === null || it.placed.tier >= top)
    .map((it) => standsMm[it.decoration.glyph]);
  return (
    board.heightMm + tiers.reduce((sum, it) => sum + it.block.heightMm, 0) + Math.max(0, ...onTop)
  );
}
