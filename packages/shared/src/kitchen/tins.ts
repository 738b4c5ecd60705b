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

/** Depths of tins, 2, 3 and 4 in (trade memory). */
const depthsMm = [51, 76, 102] as const;

/** A sponge higher than this from one tin bakes unevenly, so it is baked in two (memory). */
const highestInOneTinMm = 76;

/**
 * Tins of a body: two layers are baked together and split where that is no higher than a tin of 3
 * in, else each has a tin. Null without sponge.
 */
export function tinsOf({
  block,
  layers,
  sponge,
  filling,
  real,
}: Omit<ResolvedBody, 'coating' | 'keepsake'>): Tins | null {
  if (sponge === null || !real) return null;
  const gaps = filling === null ? 0 : layers - 1;
  const spongeMm = Math.max(0, block.heightMm - gaps * (filling?.thicknessMm ?? 0));
  // What levelling takes off is baked too.
  const bakedLayerMm = spongeMm / layers / (1 - sponge.levellingPpm / 1e6);
  const layersEach = layers > 1 && 2 * bakedLayerMm <= highestInOneTinMm ? 2 : 1;
  const count = Math.ceil(layers / layersEach);
  const bakedMm = layersEach * bakedLayerMm;
  const depthMm = depthsMm.find((it) => it >= bakedMm) ?? depthsMm[2];
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
    fillMm: { least: depthMm / 2, most: (depthMm * 2) / 3 },
  };
}
