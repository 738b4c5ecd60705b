import type { Cake, CuttingCake, Look, Sheet, Tier } from '#shared/contracts/design.ts';
import type { DesignPatch, Proposal } from '#shared/contracts/estimates.ts';
import type { Menu, SheetSize } from '#shared/contracts/menu.ts';
import { cuttingCakeOf, usualSheetLayers } from '#shared/kitchen/propose-cutting.ts';
import type { OrderForm } from '../draft/empty-order.ts';
import type { Inside } from './first-inside.ts';

/** The parts of the form that change together: words and decorations follow their tier. */
export type CakeAndLook = { readonly cake: Cake; readonly look: Look };

export const mostTiers = 6;

/** Moves words and decorations with the tiers; null is a tier that is gone with what was on it. */
function followTiers(look: Look, to: (tier: number) => number | null): Look {
  return {
    ...look,
    words: look.words.flatMap((it) => {
      const tier = to(it.tier);
      return tier === null ? [] : [{ ...it, tier }];
    }),
    decorations: look.decorations.flatMap((it) => {
      if (it.tier === null) return [it];
      const tier = to(it.tier);
      return tier === null ? [] : [{ ...it, tier }];
    }),
  };
}

/** Words may stand only once on a tier: what lands on the same one is read on. */
function joinWords(look: Look): Look {
  const joined = new Map<number, string>();
  for (const { tier, text } of look.words) {
    if (text.trim() === '') continue;
    const before = joined.get(tier);
    joined.set(tier, before === undefined ? text : `${before} ${text}`);
  }
  return { ...look, words: [...joined].map(([tier, text]) => ({ tier, text })) };
}

/** What a proposal says of the cake. */
type Proposed = Pick<Proposal, 'tiers' | 'cuttingCakes'>;

/**
 * Takes a proposed stack and its cutting cakes. Sponges and fillings already chosen stay, from the
 * board up; words and decorations of tiers it does not have move to its top.
 */
export function takeProposal(
  { cake, look }: CakeAndLook,
  { tiers, cuttingCakes }: Proposed,
): CakeAndLook {
  const top = Math.max(0, tiers.length - 1);
  return {
    cake: {
      ...cake,
      kind: 'tiered',
      cuttingCakes: cuttingCakes.map((it) => withInsideOf(cake, it)),
      tiers: tiers.map((tier, at) => {
        const before = cake.tiers[at] ?? cake.tiers.at(-1);
        if (before === undefined || !tier.real) return tier;
        return {
          ...tier,
          spongeId: before.spongeId ?? tier.spongeId,
          fillingId: before.fillingId ?? tier.fillingId,
        };
      }),
    },
    look: joinWords(followTiers(look, (tier) => Math.min(tier, top))),
  };
}

/** Everybody eats the same: a cutting cake takes the inside that was chosen for the cake. */
function withInsideOf(cake: Cake, cutting: CuttingCake): CuttingCake {
  const chosen = cake.cuttingCakes[0] ?? cake.tiers.find((it) => it.real);
  return {
    ...cutting,
    spongeId: chosen?.spongeId ?? cutting.spongeId,
    fillingId: chosen?.fillingId ?? cutting.fillingId,
  };
}

/** Whether the cake is the proposal, but for what is inside it. */
export function isProposal(cake: Cake, { tiers, cuttingCakes }: Proposed): boolean {
  return (
    cake.kind === 'tiered' &&
    cake.tiers.length === tiers.length &&
    cake.cuttingCakes.length === cuttingCakes.length &&
    cuttingCakes.every((it, at) => {
      const own = cake.cuttingCakes[at];
      return own !== undefined && own.sizeId === it.sizeId && own.count === it.count;
    }) &&
    tiers.every((tier, at) => {
      const own = cake.tiers[at];
      return (
        own !== undefined &&
        own.shape === tier.shape &&
        own.widthMm === tier.widthMm &&
        own.depthMm === tier.depthMm &&
        own.heightMm === tier.heightMm &&
        own.real === tier.real &&
        own.keepsake === tier.keepsake
      );
    })
  );
}

/** The tier that would sensibly go on top: the next size down, inside like the one below. */
export function nextTier(cake: Cake, menu: Menu, inside: Inside): Tier | null {
  const below = cake.tiers.at(-1);
  const sizes = menu.tierSizes
    .filter((size) => below === undefined || size.shape === below.shape)
    .toSorted((a, b) => b.widthMm - a.widthMm);
  const fitting = below
    ? sizes.filter((size) => size.widthMm <= below.widthMm - menu.kitchen.smallestStepMm)
    : sizes.filter((size) => size.shape === 'round' && size.widthMm <= 250);
  const size = fitting[0] ?? sizes.at(-1);
  if (size === undefined || cake.tiers.length >= mostTiers) return null;
  const heightMm =
    below && size.heightsMm.includes(below.heightMm) ? below.heightMm : size.heightsMm[0];
  if (heightMm === undefined) return null;
  return {
    shape: size.shape,
    widthMm: size.widthMm,
    depthMm: size.depthMm,
    heightMm,
    layers: below?.layers ?? 3,
    real: true,
    keepsake: false,
    spongeId: below?.spongeId ?? inside.spongeId,
    fillingId: below?.fillingId ?? inside.fillingId,
    coating: null,
  };
}

export function addTier(from: CakeAndLook, tier: Tier): CakeAndLook {
  return { ...from, cake: { ...from.cake, kind: 'tiered', tiers: [...from.cake.tiers, tier] } };
}

/** Takes a tier away, with what was on it; those above come down. */
export function removeTier({ cake, look }: CakeAndLook, at: number): CakeAndLook {
  return {
    cake: { ...cake, tiers: cake.tiers.filter((_, index) => index !== at) },
    look: followTiers(look, (tier) => (tier === at ? null : tier > at ? tier - 1 : tier)),
  };
}

/** Moves a tier up (1) or down (-1) by one, with what is on it; unchanged at the ends. */
export function moveTier({ cake, look }: CakeAndLook, at: number, by: 1 | -1): CakeAndLook {
  const to = at + by;
  const moving = cake.tiers[at];
  const other = cake.tiers[to];
  if (moving === undefined || other === undefined) return { cake, look };
  return {
    cake: {
      ...cake,
      tiers: cake.tiers.map((tier, index) => (index === at ? other : index === to ? moving : tier)),
    },
    look: followTiers(look, (tier) => (tier === at ? to : tier === to ? at : tier)),
  };
}

/**
 * A tier with some answers changed, kept sound: a round or square one is as deep as it is wide, a
 * dummy has nothing inside and is nobody's keepsake, a real one gets an inside again.
 */
export function changeTier(tier: Tier, change: Partial<Tier>, inside: Inside): Tier {
  const next = { ...tier, ...change };
  if (next.shape !== 'rectangle') next.depthMm = next.widthMm;
  if (!next.real) return { ...next, spongeId: null, fillingId: null, keepsake: false };
  return {
    ...next,
    spongeId: next.spongeId ?? inside.spongeId,
    fillingId: next.fillingId ?? inside.fillingId,
  };
}

/** Takes a sheet of this size; its inside stays, or is that of the tiers. */
export function takeSheet(
  { cake, look }: CakeAndLook,
  size: SheetSize,
  inside: Inside,
): CakeAndLook {
  const before: Sheet | null = cake.sheet;
  const tier = cake.tiers.find((it) => it.real);
  return {
    cake: {
      ...cake,
      kind: 'sheet',
      sheet: {
        sizeId: size.id,
        layers: before?.layers ?? usualSheetLayers(size),
        spongeId: before?.spongeId ?? tier?.spongeId ?? inside.spongeId,
        fillingId: before ? before.fillingId : (tier?.fillingId ?? null),
      },
    },
    look,
  };
}

/** Adds cutting cakes of one size, with the inside of the cake on show. */
export function addCuttingCakes(
  { cake, look }: CakeAndLook,
  cut: { readonly size: SheetSize; readonly count: number },
  inside: Inside,
): CakeAndLook {
  const { size, count } = cut;
  const added = withInsideOf(cake, cuttingCakeOf(size, count, inside));
  return { cake: { ...cake, cuttingCakes: [...cake.cuttingCakes, added] }, look };
}

/** Applies a piece of advice in one press: only the parts it names change. */
export function applyPatch(values: OrderForm, patch: DesignPatch): OrderForm {
  const cake = patch.cake ?? values.cake;
  // Of the look a way out leaves out decorations; words somebody is just typing stay.
  const look =
    patch.look === undefined
      ? values.look
      : { ...values.look, decorations: patch.look.decorations };
  const top = Math.max(0, cake.tiers.length - 1);
  return {
    ...values,
    // A draft keeps what the choice not taken held; a patch speaks of the one that is.
    cake: {
      ...cake,
      tiers: cake.kind === 'sheet' ? values.cake.tiers : cake.tiers,
      sheet: cake.kind === 'tiered' ? values.cake.sheet : cake.sheet,
    },
    look:
      cake.kind === 'tiered' ? joinWords(followTiers(look, (tier) => Math.min(tier, top))) : look,
    setting: patch.setting ?? values.setting,
  };
}
