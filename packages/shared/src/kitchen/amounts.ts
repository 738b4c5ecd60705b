import type { CarriedPiece } from '#shared/contracts/estimates.ts';
import type { KitchenRules } from '#shared/contracts/kitchen-rules.ts';
import type { Decoration } from '#shared/contracts/menu.ts';
import { looseDecorationsG, pipedPerTier } from './piped.ts';
import type { ResolvedBody, ResolvedDesign } from './resolve-design.ts';
import { areaMm2, boardOf, ledgesOf, perimeterMm, volumeMl } from './sizes.ts';

/** Grams of one tier, sheet or cutting cake: what is made for it, and what of that is carried. */
export type BodyAmounts = {
  /** Finished and levelled. */
  readonly spongeG: number;
  /** What goes into its tins. */
  readonly batterG: number;
  readonly fillingG: number;
  /** Buttercream to make: coats, dam, borders and lettering, bowl and bag included. */
  readonly frostingG: number;
  /** What of it is on the cake. */
  readonly frostingOnCakeG: number;
  /** Fondant or ganache to make, bowl and bag included for ganache. */
  readonly coveringG: number;
  readonly coveringOnCakeG: number;
  /** With its cards, a dummy's foam too. */
  readonly carriedG: number;
};

type Sums = Omit<BodyAmounts, 'carriedG'>;

export type CakeAmounts = Sums & {
  readonly perTier: readonly BodyAmounts[];
  /** Of one of each kind; the sums above count all of them. */
  readonly perCuttingCake: readonly BodyAmounts[];
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
function coatMl(tier: ResolvedBody, visibleTopMm2: number, thicknessMm: number): number {
  const sideMm2 = perimeterMm(tier.block) * tier.block.heightMm;
  return ((sideMm2 + visibleTopMm2) * thicknessMm) / 1000;
}

/** Length times the bead's cross-section: a foot border, or foot and rim where it is piped. */
function borderMl(tier: ResolvedBody, rules: KitchenRules): number {
  const piped = tier.coating?.finish === 'piped';
  const bead = piped ? rules.pipedBeadMm : rules.footBeadMm;
  const lengthMm = perimeterMm(tier.block) * (piped ? 2 : 1);
  return (lengthMm * Math.PI * (bead / 2) ** 2) / 1000;
}

type Coats = { readonly frostingMl: number; readonly coveringMl: number };

function coatsOf(tier: ResolvedBody, visibleTopMm2: number, rules: KitchenRules): Coats {
  const { crumbCoatMm, finalCoatMm, underFondantMm } = rules;
  const coat = (thicknessMm: number) => coatMl(tier, visibleTopMm2, thicknessMm);
  if (tier.coating === null) return { frostingMl: 0, coveringMl: 0 };
  const { covering } = tier.coating;
  switch (covering.id) {
    case 'buttercream':
      return { frostingMl: coat(crumbCoatMm + finalCoatMm) + borderMl(tier, rules), coveringMl: 0 };
    case 'semi-naked':
      return { frostingMl: coat(crumbCoatMm), coveringMl: 0 };
    case 'fondant':
      return { frostingMl: coat(underFondantMm), coveringMl: coat(covering.thicknessMm) };
    case 'ganache':
      return { frostingMl: 0, coveringMl: coat(covering.thicknessMm) };
  }
}

/** What is laid or piped on a body beyond its coats. */
type OnBody = {
  /** Its whole top, or the ledge left in sight, square millimetres. */
  readonly visibleTopMm2: number;
  /** Piped decorations and lettering in its own buttercream, grams on the cake. */
  readonly pipedG: number;
};

/** Grams of one body by the studio's figures, unrounded. */
export function amountsOfBody(
  body: ResolvedBody,
  { visibleTopMm2, pipedG }: OnBody,
  rules: KitchenRules,
): BodyAmounts {
  const { block, sponge, filling, coating } = body;
  const gaps = body.real && filling !== null ? Math.max(0, body.layers - 1) : 0;
  const thicknessMm = filling?.thicknessMm ?? 0;
  const gapMl = (gaps * areaMm2(block) * thicknessMm) / 1000;
  const damMl =
    filling?.soft === true && coating !== null
      ? Math.min(gapMl, (gaps * perimeterMm(block) * rules.damMm * thicknessMm) / 1000)
      : 0;
  const spongeG = Math.max(0, volumeMl(block) - gapMl) * (sponge?.densityGPerMl ?? 0);
  const fillingG = (gapMl - damMl) * (filling?.densityGPerMl ?? 0);

  const coats = coatsOf(body, visibleTopMm2, rules);
  // Ganache has no buttercream beside it, so it makes its own dam, borders and letters.
  const alone = coating !== null && coating.style === null;
  const style = coating?.style ?? null;
  const frostingOnCakeG =
    style === null ? 0 : (coats.frostingMl + damMl) * style.densityGPerMl + pipedG;
  const coveringOnCakeG =
    (coats.coveringMl + (alone ? damMl : 0)) * (coating?.covering.densityGPerMl ?? 0) +
    (alone ? pipedG : 0);
  const spare = 1 + rules.bowlAndBagPpm / 1e6;
  const dummyG = body.real ? 0 : volumeMl(block) * rules.dummyGPerMl;
  return {
    spongeG,
    batterG: sponge === null ? 0 : batterG(spongeG, sponge),
    fillingG,
    frostingG: frostingOnCakeG * spare,
    frostingOnCakeG,
    coveringG: coating?.covering.id === 'ganache' ? coveringOnCakeG * spare : coveringOnCakeG,
    coveringOnCakeG,
    carriedG: spongeG + fillingG + frostingOnCakeG + coveringOnCakeG + dummyG + cardsG(body, rules),
  };
}

/** The card under a tier, and the inner one of a tall tier; both are hidden and carried. */
function cardsG({ block, real }: ResolvedBody, rules: KitchenRules): number {
  const cards = real && block.heightMm > rules.doubleHeightMm ? 2 : 1;
  const ml = (areaMm2(block) * rules.cardThicknessMm) / 1000;
  return cards * ml * rules.cardGPerMl;
}

/** Grams of the whole cake and its cutting cakes, unrounded, and of each piece. */
export function amountsOf(resolved: ResolvedDesign): CakeAmounts {
  const rules = resolved.menu.kitchen;
  const ledges = ledgesOf(resolved.tiers.map((it) => it.block));
  const piped = pipedPerTier(resolved);
  const perTier = resolved.tiers.map((tier, index) =>
    amountsOfBody(
      tier,
      { visibleTopMm2: ledges[index]?.areaMm2 ?? 0, pipedG: piped[index] ?? 0 },
      rules,
    ),
  );
  const perCuttingCake = resolved.cuttingCakes.map((body) =>
    amountsOfBody(body, { visibleTopMm2: areaMm2(body.block), pipedG: 0 }, rules),
  );
  const sum = (kind: keyof Sums) =>
    perTier.reduce((total, it) => total + it[kind], 0) +
    perCuttingCake.reduce(
      (total, it, index) => total + it[kind] * (resolved.cuttingCakes[index]?.count ?? 0),
      0,
    );
  return {
    spongeG: sum('spongeG'),
    batterG: sum('batterG'),
    fillingG: sum('fillingG'),
    frostingG: sum('frostingG'),
    frostingOnCakeG: sum('frostingOnCakeG'),
    coveringG: sum('coveringG'),
    coveringOnCakeG: sum('coveringOnCakeG'),
    perTier,
    perCuttingCake,
  };
}

/**
 * The cake on show as it is carried: tiers, cards, board and decorations, without its cutting
 * cakes; 0 before it exists.
 */
export function carriedWeightG(resolved: ResolvedDesign, amounts: CakeAmounts): number {
  const { design, menu } = resolved;
  if (design.cake === null || resolved.tiers.length === 0) return 0;
  const board = boardOf(design.cake, menu);
  const boardG = board === null ? 0 : volumeMl(board) * menu.kitchen.boardGPerMl;
  const tiersG = amounts.perTier.reduce((sum, it) => sum + it.carriedG, 0);
  return Math.round(tiersG + boardG + looseDecorationsG(resolved));
}

/** Each piece as somebody lifts it, whole grams; a tier before anything is put on it. */
export function carriedPieces(resolved: ResolvedDesign, amounts: CakeAmounts): CarriedPiece[] {
  const kind = resolved.design.cake?.kind === 'sheet' ? 'sheet' : 'tier';
  return [
    ...amounts.perTier.map(({ carriedG }, index): CarriedPiece => ({
      kind,
      index,
      count: 1,
      weightG: Math.round(carriedG),
    })),
    ...resolved.cuttingCakes.map(({ index, count }): CarriedPiece => ({
      kind: 'cutting-cake',
      index,
      count,
      weightG: Math.round(amounts.perCuttingCake[index]?.carriedG ?? 0),
    })),
  ];
}

/** How far above the cake a thing reaches that stands on top, mm; what lies flat reaches nowhere. */
function standsMm(glyph: Decoration['glyph'], rules: KitchenRules): number {
  switch (glyph) {
    case 'topper':
      return rules.topperStandsMm;
    case 'figure':
      return rules.figureStandsMm;
    case 'flower':
      return rules.flowerStandsMm;
    case 'fruit':
      return rules.fruitStandsMm;
    case 'leaf':
      return rules.leafStandsMm;
    case 'border':
      return rules.borderStandsMm;
    case 'pearl':
    case 'drip':
    case 'print':
    case 'ribbon':
    case 'sprinkle':
      return 0;
  }
}

/** Millimetres from the table to the tip: board, tiers, what stands on top; 0 without a cake. */
export function heightMm(resolved: ResolvedDesign): number {
  const { design, menu, tiers } = resolved;
  const board = design.cake === null ? null : boardOf(design.cake, menu);
  if (board === null) return 0;
  const top = tiers.length - 1;
  const onTop = resolved.decorations
    .filter((it) => it.placed.tier === null || it.placed.tier >= top)
    .map((it) => standsMm(it.decoration.glyph, menu.kitchen));
  return (
    board.heightMm + tiers.reduce((sum, it) => sum + it.block.heightMm, 0) + Math.max(0, ...onTop)
  );
}
