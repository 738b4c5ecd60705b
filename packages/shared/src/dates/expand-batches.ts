import type { ButtercreamStyle } from '#shared/contracts/menu.ts';
import type { TaskKind } from '#shared/contracts/vocabulary.ts';
import { groupBy } from '#shared/group-by.ts';
import { tinsOf } from '#shared/kitchen/tins.ts';
import { batchMinutes, sum, type Expansion, type Layer } from './expansion.ts';
import type { BatchSource, Work } from './model.ts';

/** Keys of the batches, by the id of the part they are for. */
export type Batches = ReadonlyMap<string, readonly string[]>;

type BatchPlan = {
  readonly key: string;
  readonly kind: TaskKind;
  readonly label: string;
  readonly source: BatchSource;
  readonly grams: number;
  readonly bowls: number;
};

/** Bowls of one formula, in as many batches as keep each within the longest piece. */
function addBatches(
  plan: Expansion,
  batch: BatchPlan,
  timesOf: (bowls: number, grams: number) => Pick<Work, 'minutes'> & Partial<Work>,
): string[] {
  const { bowls, grams } = batch;
  let count = 1;
  while (
    count < bowls &&
    timesOf(Math.ceil(bowls / count), Math.ceil(grams / count)).minutes > plan.times.longestPiece
  ) {
    count += 1;
  }
  return Array.from({ length: count }, (_, n) => {
    const share = (whole: number) => Math.floor(whole / count) + (n < whole % count ? 1 : 0);
    const partBowls = Math.max(1, share(bowls));
    const partGrams = Math.max(1, share(grams));
    return plan.add({
      key: count === 1 ? batch.key : `${batch.key}/${n + 1}`,
      kind: batch.kind,
      label: count === 1 ? batch.label : `${batch.label}, batch ${n + 1} of ${count}`,
      batch: { source: batch.source, grams: partGrams, bowls: partBowls },
      ...timesOf(partBowls, partGrams),
    });
  });
}

/** Batches by sponge: hands and mixer first, then the oven. */
export function bakeSponges(plan: Expansion, layers: readonly Layer[]): Batches {
  const { bake: times } = plan.times;
  const { bowlG, deckMm2, decks } = plan.equipment;
  const keys = new Map<string, string[]>();
  for (const [sponge, of] of groupBy(layers, (it) => it.body.sponge)) {
    if (sponge === null) continue;
    const grams = Math.max(1, sum(of.map((it) => it.batterG)));
    const tinsMm2 = sum(
      of.map(({ body, count }) => {
        const { widthMm, depthMm } = body.block;
        return count * (tinsOf(body, plan.rules)?.count ?? 0) * widthMm * depthMm;
      }),
    );
    const loads = Math.max(1, Math.ceil(tinsMm2 / deckMm2));
    const mixBowls = Math.max(1, Math.ceil(grams / bowlG));
    const made = addBatches(
      plan,
      {
        key: `bake:${sponge.id}`,
        kind: 'bake',
        label: `Bake ${sponge.name}`,
        source: { part: 'sponge', id: sponge.id },
        grams,
        bowls: Math.max(loads, mixBowls),
      },
      (bowls, partGrams) => {
        const hands = batchMinutes(bowls, partGrams, times);
        return {
          minutes: hands + Math.ceil(bowls / decks) * times.ovenPerLoad,
          benchMinutes: hands,
          mixerMinutes: Math.min(hands, bowls * times.mixerPerBowl),
          ovenMinutes: bowls * times.ovenPerLoad,
        };
      },
    );
    keys.set(sponge.id, made);
  }
  return keys;
}

export function makeFillings(plan: Expansion, layers: readonly Layer[]): Batches {
  const keys = new Map<string, string[]>();
  for (const [filling, of] of groupBy(layers, (it) => (it.fillingG > 0 ? it.body.filling : null))) {
    if (filling === null) continue;
    const grams = sum(of.map((it) => it.fillingG));
    keys.set(
      filling.id,
      addBatches(
        plan,
        {
          key: `filling:${filling.id}`,
          kind: 'filling',
          label: `Make ${filling.name}`,
          source: { part: 'filling', id: filling.id },
          grams,
          bowls: Math.ceil(grams / plan.equipment.bowlG),
        },
        (bowls, partGrams) => ({ minutes: batchMinutes(bowls, partGrams, plan.times.filling) }),
      ),
    );
  }
  return keys;
}

export type Frostings = {
  readonly byStyle: Batches;
  readonly ganache: readonly string[];
};

/** Buttercreams by style (custard base first where the style has one), and ganache. */
export function mixFrostings(plan: Expansion, layers: readonly Layer[]): Frostings {
  const byStyle = new Map<string, string[]>();
  for (const [style, of] of groupBy(layers, (it) => it.body.coating?.style ?? null)) {
    if (style === null) continue;
    byStyle.set(style.id, mixStyle(plan, style, Math.max(1, sum(of.map((it) => it.frostingG)))));
  }
  const underGanache = layers.filter((it) => it.body.coating?.covering.id === 'ganache');
  const grams = sum(underGanache.map((it) => it.coveringG + it.frostingG));
  const ganache =
    underGanache.length === 0
      ? []
      : addBatches(
          plan,
          {
            key: 'ganache',
            kind: 'filling',
            label: 'Make ganache',
            source: { part: 'covering', id: 'ganache' },
            grams: Math.max(1, grams),
            bowls: Math.max(1, Math.ceil(grams / plan.equipment.bowlG)),
          },
          (bowls, partGrams) => ({ minutes: batchMinutes(bowls, partGrams, plan.times.ganache) }),
        );
  return { byStyle, ganache };
}

function mixStyle(plan: Expansion, style: ButtercreamStyle, grams: number): string[] {
  const times = plan.times.buttercream[style.id];
  const bowls = Math.ceil(grams / plan.equipment.bowlG);
  const made = addBatches(
    plan,
    {
      key: `buttercream:${style.id}`,
      kind: 'buttercream',
      label: `Make ${style.name} buttercream`,
      source: { part: 'style', id: style.id },
      grams,
      bowls,
    },
    (partBowls, partGrams) => {
      const hands = batchMinutes(partBowls, partGrams, times);
      const mixer = partBowls * times.mixerPerBowl;
      return { minutes: Math.max(hands, mixer), benchMinutes: hands, mixerMinutes: mixer };
    },
  );
  if (!times.custard) return made;
  // The custard is a part of the buttercream's weight; a half is on the safe side for the bowl.
  const custardG = Math.max(1, Math.ceil(grams / 2));
  const custards = addBatches(
    plan,
    {
      key: `custard:${style.id}`,
      kind: 'custard',
      label: `Cook the custard for ${style.name} buttercream`,
      source: { part: 'custard', id: style.id },
      grams: custardG,
      bowls: Math.ceil(custardG / plan.equipment.bowlG),
    },
    (partBowls, partGrams) => ({ minutes: batchMinutes(partBowls, partGrams, plan.times.custard) }),
  );
  for (const custard of custards) {
    for (const buttercream of made) {
      plan.link(
        custard,
        buttercream,
        plan.times.gaps.custardToButtercream,
        plan.times.keeps.custardHours,
      );
    }
  }
  return made;
}
