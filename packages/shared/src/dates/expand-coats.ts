import type {
  ResolvedCoating,
  ResolvedDecoration,
  ResolvedDesign,
} from '#shared/kitchen/resolve-design.ts';
import type { Batches, Frostings } from './expand-batches.ts';
import {
  byArea,
  coatedMm2,
  hoursADay,
  minutesAnHour,
  type Expansion,
  type Layer,
  type NewWork,
} from './expansion.ts';

/** Fill, coat or cover one tier, or cutting cakes of one kind; answers the key of what finishes its outside. */
export function coatTier(
  plan: Expansion,
  layer: Layer,
  coating: ResolvedCoating,
  made: { readonly sponges: Batches; readonly fillings: Batches; readonly frostings: Frostings },
): string {
  const { gaps, keeps, fillAndCrumbCoat: times } = plan.times;
  const { body, count } = layer;
  const coated = coatedMm2(body.block);
  const frosting = frostingOf(coating, made.frostings);
  const filled = plan.addParts(
    {
      key: `fill:${layer.key}`,
      kind: 'fill-and-crumb-coat',
      label: body.real ? `Fill and crumb coat ${layer.name}` : `Coat the dummy of ${layer.name}`,
      tier: layer.tier,
      minutes:
        count *
        (times.perTier +
          (body.real ? body.layers * times.perLayer : 0) +
          byArea(coated, times.perDm2Tenths)),
      within: plan.finishedWithin,
    },
    true,
  );
  if (body.real) {
    const large = Math.max(body.block.widthMm, body.block.depthMm) >= gaps.largeMm;
    const cooling = large ? gaps.largeBakeToFill : gaps.bakeToFill;
    for (const key of batchesOf(made.sponges, body.sponge))
      plan.link(key, filled.first, cooling, keeps.spongeHours);
    for (const key of batchesOf(made.fillings, body.filling)) {
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
      key: `cover:${layer.key}`,
      kind: 'cover',
      label: `Cover ${layer.name} with fondant`,
      tier: layer.tier,
      minutes: layer.count * (cover.perTier + byArea(coated, cover.perDm2Tenths)),
    };
  }
  const { finalCoat } = plan.times;
  const adds = { smooth: 0, textured: finalCoat.texturedAdd, piped: finalCoat.pipedAdd };
  return {
    key: `coat:${layer.key}`,
    kind: 'final-coat',
    label: `Final coat on ${layer.name}`,
    tier: layer.tier,
    minutes:
      layer.count *
      (finalCoat.perTier + byArea(coated, finalCoat.perDm2Tenths) + adds[coating.finish]),
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
  const { gaps, keeps, setOn } = plan.times;
  const { name: label, skill, keepsDays } = decoration;
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
  const keptHours = Math.min(
    keeps.madeAheadHours,
    keepsDays === null ? keeps.madeAheadHours : keepsDays * hoursADay,
  );
  // What keeps no longer than it dries is put on as it is.
  const dries = gaps.dryBeforeSettingOn < keptHours * minutesAnHour ? gaps.dryBeforeSettingOn : 0;
  for (const part of ahead.all) plan.link(part, set, dries, keptHours);
}

/** Boxes what is finished: the cake on show and each cutting cake by itself. */
export function boxCake(
  plan: Expansion,
  pieces: number,
  dressed: Standing,
  cutting: readonly string[],
): void {
  const { box: times, gaps } = plan.times;
  const key = plan.add({
    key: 'box',
    kind: 'box',
    label: 'Box and clean down',
    minutes: times.fixed + pieces * times.perTier,
  });
  for (const before of dressed.keys) plan.link(before, key, dressed.gap, null);
  for (const coated of cutting) plan.link(coated, key, gaps.finalCoatToDecorate, null);
}
