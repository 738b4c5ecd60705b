import type { KitchenRules } from '#shared/contracts/kitchen-rules.ts';
import type { AllergenId, Severity } from '#shared/contracts/vocabulary.ts';
import { amountsOf, type BodyAmounts } from '#shared/kitchen/amounts.ts';
import { containedAllergens, partsOf } from '#shared/kitchen/parts.ts';
import type { ResolvedDesign, ResolvedTier } from '#shared/kitchen/resolve-design.ts';
import type { Block } from '#shared/kitchen/sizes.ts';
import { bakeSponges, makeFillings, mixFrostings } from './expand-batches.ts';
import { boxCake, coatTier, decorateCake, stackTiers } from './expand-coats.ts';
import { Expansion, sum, type Equipment, type Layer } from './expansion.ts';
import type { Box, Demand } from './model.ts';
import type { WorkTimes } from './work-times.ts';

export type ExpandInput = {
  readonly resolved: ResolvedDesign;
  readonly workTimes: WorkTimes;
  readonly equipment: Equipment;
  /** Days, the larger of what the kind of item and the occasion ask for. */
  readonly noticeDays: number;
};

/** Severities for which work is kept apart from what the guest must not have. */
export const keepsApart: readonly Severity[] = ['coeliac', 'allergy', 'anaphylaxis'];

/**
 * Expands a chosen cake into tasks, batches and the gaps between them, in whole minutes by the
 * studio's work times. Work longer than the longest piece is split into parts. Handing over is no
 * work here: the pickup windows count it. Tiers keep cold places of their own, since most stand
 * apart until they are stacked.
 * @throws when the design has no cake or no coating yet
 */
export function expandDesign({ resolved, workTimes, equipment, noticeDays }: ExpandInput): Demand {
  const plan = new Expansion(workTimes, equipment, resolved.menu.kitchen);
  const shown = shownLayers(resolved);
  const cutting = cuttingLayers(resolved);
  const layers = [...shown, ...cutting];
  const real = layers.filter((it) => it.body.real);
  const sponges = bakeSponges(plan, real);
  const fillings = makeFillings(plan, real);
  const frostings = mixFrostings(plan, layers);
  const coat = (layer: Layer) => {
    if (layer.body.coating === null) throw new Error('A cake without a coating cannot be planned.');
    return coatTier(plan, layer, layer.body.coating, { sponges, fillings, frostings });
  };
  const coats = shown.map(coat);
  if (coats.length === 0) throw new Error('A design without a cake cannot be planned.');
  const cut = cutting.map(coat);
  const standing = stackTiers(plan, shown, coats);
  const dressed = decorateCake(plan, resolved, standing);
  boxCake(plan, sum(layers.map((it) => it.count)), dressed, cut);
  const contains = containedAllergens(partsOf(resolved))
    .filter((it) => it.state === 'contains')
    .map((it) => it.allergen);
  return {
    occasionId: resolved.design.guests.occasionId,
    noticeDays: Math.max(noticeDays, ...resolved.decorations.map((it) => it.decoration.noticeDays)),
    work: plan.work,
    links: plan.links,
    boxes: layers.flatMap(({ body, count }) =>
      Array.from({ length: count }, () => boxOf(body.block, resolved.menu.kitchen)),
    ),
    contains,
    apart: apartFrom(resolved, contains),
  };
}

/** A cake that contains the allergen cannot be kept apart from it; that is the advice's to stop. */
function apartFrom({ design }: ResolvedDesign, contains: readonly AllergenId[]): AllergenId[] {
  const declared = design.guests.allergies
    .filter((it) => keepsApart.includes(it.severity))
    .flatMap((it) => it.allergen ?? []);
  return [...new Set(declared)].filter((it) => !contains.includes(it));
}

function shownLayers(resolved: ResolvedDesign): Layer[] {
  const { perTier } = amountsOf(resolved);
  return resolved.tiers.map((body, index) => ({
    body,
    tier: index,
    key: String(index),
    count: 1,
    name: tierName(body, resolved),
    ...gramsOf(perTier[index], 1),
  }));
}

function cuttingLayers(resolved: ResolvedDesign): Layer[] {
  const { perCuttingCake } = amountsOf(resolved);
  return resolved.cuttingCakes.map((body, index) => ({
    body,
    tier: null,
    key: `cutting-${index}`,
    count: body.count,
    name: body.count === 1 ? 'the cutting cake' : `${body.count} cutting cakes`,
    ...gramsOf(perCuttingCake[index], body.count),
  }));
}

function gramsOf(amounts: BodyAmounts | undefined, count: number) {
  const whole = (grams: number | undefined) => Math.ceil((grams ?? 0) * count);
  return {
    batterG: whole(amounts?.batterG),
    fillingG: whole(amounts?.fillingG),
    frostingG: whole(amounts?.frostingG),
    coveringG: whole(amounts?.coveringG),
  };
}

function tierName({ index }: ResolvedTier, { design, tiers }: ResolvedDesign): string {
  if (design.cake?.kind === 'sheet') return 'the sheet';
  if (tiers.length === 1) return 'the cake';
  if (index === 0) return 'the bottom tier';
  if (index === tiers.length - 1) return 'the top tier';
  return tiers.length === 3 ? 'the middle tier' : `tier ${index + 1}`;
}

/** What a tier takes of the fridge on its board, with the room round and over it. */
export function boxOf(
  block: Pick<Block, 'widthMm' | 'depthMm' | 'heightMm'>,
  { fridgeMarginMm, fridgeHeadroomMm }: KitchenRules,
): Box {
  return {
    widthMm: block.widthMm + 2 * fridgeMarginMm,
    depthMm: block.depthMm + 2 * fridgeMarginMm,
    heightMm: block.heightMm + fridgeHeadroomMm,
  };
}
