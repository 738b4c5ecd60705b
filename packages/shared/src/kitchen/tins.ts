import type { KitchenRules } from '#shared/contracts/kitchen-rules.ts';
import { batterG } from './amounts.ts';
import type { ResolvedBody } from './resolve-design.ts';
import { volumeMl } from './sizes.ts';

/** The tins one tier, sheet or cutting cake is baked in, each of its own width. */
export type Tins = {
  readonly count: number;
  /** Layers that are split from one tin's sponge; the last tin may have one fewer. */
  readonly layersEach: number;
  readonly depthMm: number;
  /** Batter of the tins in order, grams, unrounded. */
  readonly batterG: readonly number[];
  /** How high the batter stands in a full tin: half to two thirds of it (memory). */
  readonly fillMm: { readonly least: number; readonly most: number };
};

/**
 * Tins of a body: two layers are baked together and split where one tin bakes that high evenly, else
 * each has a tin. Null without sponge.
 */
export function tinsOf(
  { block, layers, sponge, filling, real }: Omit<ResolvedBody, 'coating' | 'keepsake'>,
  rules: KitchenRules,
): Tins | null {
  if (sponge === null || !real) return null;
  const gaps = filling === null ? 0 : layers - 1;
  const spongeMm = Math.max(0, block.heightMm - gaps * (filling?.thicknessMm ?? 0));
  // What levelling takes off is baked too.
  const bakedLayerMm = spongeMm / layers / (1 - sponge.levellingPpm / 1e6);
  const layersEach = layers > 1 && 2 * bakedLayerMm <= rules.highestInOneTinMm ? 2 : 1;
  const count = Math.ceil(layers / layersEach);
  const bakedMm = layersEach * bakedLayerMm;
  const { shallowTinMm, middleTinMm, deepTinMm } = rules;
  const depthMm = [shallowTinMm, middleTinMm].find((it) => it >= bakedMm) ?? deepTinMm;
  const layerG = batterG(
    (volumeMl({ ...block, heightMm: spongeMm }) * sponge.densityGPerMl) / layers,
    sponge,
  );
  return {
    count,
    layersEach,
    depthMm,
    batterG: Array.from({ length: count }, (_, n) =>
      n < count - 1 ? layersEach * layerG : (layers - n * layersEach) * layerG,
    ),
    fillMm: {
      least: (depthMm * rules.tinFillLeastPpm) / 1e6,
      most: (depthMm * rules.tinFillMostPpm) / 1e6,
    },
  };
}
