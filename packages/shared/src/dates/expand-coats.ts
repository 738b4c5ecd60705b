import type {
  ResolvedCoating,
  ResolvedDecoration,
  ResolvedDesign,
} from '#shared/kitchen/resolve-design.ts';
import type { Batches, Frostings } from './expand-batches.ts';
import {
  byArea,
  coatedMm2,
  minutesAnHour,
  type Expansion,
  type Layer,
  type NewWork,
} from './expansion.ts';

/** Fill, coat or cover one tier; answers the key of what finishes its outside. */
export function coatTier(
  plan: Expansion,
  layer: Layer,
  coating: ResolvedCoating,
  made: { readonly sponges: Batches; readonly fillings: Batches; readonly frostings: Frostings },
): string {
  const { gaps, keeps, fillAndCrumbCoat: times } = plan.times;
  const { tier } = layer;
  const coated = coatedMm2(tier.block);
  const frosting = frostingOf(coating, made.frostings);
  const filled = plan.addParts(
    {
      key: `fill:${layer.index}`,
      kind: 'fill-and-crumb-coat',
      label: tier.real ? `Fill and crumb coat ${layer.name}` : `Coat the dummy of ${layer.name}`,
      tier: layer.index,
      minutes:
        times.perTier +
        (tier.real ? tier.layers * times.perLayer : 0) +
        byArea(coated, times.perDm2Tenths),
      within: plan.finishedWithin,
    },
    true,
  );
  if (tier.real) {
    const large = Math.max(tier.block.widthMm, tier.block.depthMm) >= gaps.largeMm;
    const cooling = large ? gaps.largeBakeToFill : gaps.bakeToFill;
    for (const key of batchesOf(made.sponges, tier.sponge))
      plan.link(key, filled.first, cooling, keeps.spongeHours);
    for (const key of batchesOf(made.fillings, tier.filling)) {
      plan.link(key, filled.first, gaps.fillingToFill, keeps.fillingHours);
    }
  }
  for (const key of frosting) plan.link(key, filled.first, 0, keeps.buttercreamHours);
  if (coating.covering.id === 'semi-naked') return filled.last;
  const outside = plan.addParts(outsideOf(plan, layer, coating, coated), true);
  plan.link(filled.last, outside.first, gaps.fillToFinalCoat, null);
  for (const key of frosting) plan.link(key, outside.first, 0, keeps.buttercreamHours);
  return outside.last;
}

function batchesOf(batches: Batches, part: { readonly id: string } | null): readonly string[] {
  return part === null ? [] : (batches.get(part.id) ?? []);
}

function frostingOf({ covering, style }: ResolvedCoating, frostings: Frostings): readonly string[] {
  return covering.id === 'ganache' ? frostings.ganache : batchesOf(frostings.byStyle, style);
}

function outsideOf(
  plan: Expansion,
  layer: Layer,
  coating: ResolvedCoating,
  coated: number,
): NewWork {
  if (coating.covering.id === 'fondant') {
    const { cover } = plan.times;
    return {
      key: `cover:${layer.index}`,
      kind: 'cover',
      label: `Cover ${layer.name} with fondant`,
      tier: layer.index,
      minutes: cover.perTier + byArea(coated, cover.perDm2Tenths),
    };
  }
  const { finalCoat } = plan.times;
  const adds = { smooth: 0, textured: finalCoat.texturedAdd, piped: finalCoat.pipedAdd };
  return {
    key: `coat:${layer.index}`,
    kind: 'final-coat',
    label: `Final coat on ${layer.name}`,
    tier: layer.index,
    minutes: finalCoat.perTier + byArea(coated, finalCoat.perDm2Tenths) + adds[coating.finish],
  };
}

/** One tier stands by itself; more are stacked. Answers the keys the decorating waits for. */
export function stackTiers(
  plan: Expansion,
  layers: readonly Layer[],
  coats: readonly string[],
): Standing {
  const { stack: times, gaps } = plan.times;
  if (layers.length < 2) return { keys: coats, gap: gaps.finalCoatToDecorate };
  const key = plan.add({
    key: 'stack',
    kind: 'stack',
    label: `Stack ${layers.length} tiers`,
    minutes: times.fixed + layers.length * times.perTier,
  });
  for (const coated of coats) plan.link(coated, key, gaps.finalCoatToStack, null);
  return { keys: [key], gap: 0 };
}

/** What further work waits for, and how long after it. */
export type Standing = { readonly keys: readonly string[]; readonly gap: number };

type AddOnCake = (work: Omit<NewWork, 'kind'>) => string;

/** Decorations and words; answers what must be done before the cake is boxed. */
export function decorateCake(
  plan: Expansion,
  resolved: ResolvedDesign,
  standing: Standing,
): Standing {
  const done: string[] = [];
  const onCake: AddOnCake = (work) => {
    const parts = plan.addParts({ ...work, kind: 'decorate' }, true);
    for (const key of standing.keys) plan.link(key, parts.first, standing.gap, null);
    done.push(parts.last);
    return parts.first;
  };
  resolved.decorations.forEach((it, n) => {
    addDecoration(plan, it, `decorate:${n}`, resolved.tiers.length, onCake);
  });
  const { lettering } = plan.times;
  for (const [n, { tier, text }] of (resolved.design.look?.words ?? []).entries()) {
    if (text.trim() === '') continue;
    onCake({
      key: `words:${n}`,
      label: 'Write the words',
      tier,
      minutes: lettering.fixed + Math.ceil((text.length * lettering.perCharacterTenths) / 10),
      skill: lettering.skill,
    });
  }
  return done.length === 0 ? standing : { keys: done, gap: 0 };
}

function addDecoration(
  plan: Expansion,
  { placed, decoration }: ResolvedDecoration,
  key: string,
  tiers: number,
  onCake: AddOnCake,
): void {
  const { keeps, setOn } = plan.times;
  const { name: label, skill } = decoration;
  const onEveryTier = decoration.per === 'tier' && placed.tier === null ? tiers : 1;
  const minutes = decoration.minutes * (decoration.per === 'piece' ? placed.quantity : onEveryTier);
  const { tier } = placed;
  if (placed.source === 'studio' && !decoration.madeAhead) {
    if (minutes > 0) onCake({ key, label, minutes, tier, skill });
    return;
  }
  const set = onCake({
    key: `${key}/on`,
    label: `Put on: ${label}`,
    minutes: setOn,
    tier,
    within: placed.source === 'florist' ? keeps.freshFlowersHours * minutesAnHour : null,
  });
  if (placed.source !== 'studio' || minutes === 0) return;
  const ahead = plan.addParts({ key, kind: 'decorate', label, minutes, tier, skill }, false);
  for (const part of ahead.all) plan.link(part, set, 0, keeps.madeAheadHours);
}

export function boxCake(plan: Expansion, tiers: number, dressed: Standing): void {
  const { box: times } = plan.times;
  const key = plan.add({
    key: 'box',
    kind: 'box',
    label: 'Box and clean down',
    minutes: times.fixed + tiers * times.perTier,
  });
  for (const before of dressed.keys) plan.link(before, key, dressed.gap, null);
}
