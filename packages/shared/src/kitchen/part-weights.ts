import { amountsOf, type BodyAmounts } from './amounts.ts';
import { isPiped, timesOf } from './piped.ts';
import type { ResolvedBody, ResolvedDesign } from './resolve-design.ts';

/** A part of the menu, by kind and id. */
export type WeighedPart = {
  readonly part: 'sponge' | 'filling' | 'style' | 'covering' | 'decoration';
  readonly id: string;
  /** Grams on or in the cake, finished: what a label goes by. */
  readonly inCakeG: number;
  /** Grams to make: batter for a sponge, bowl and bag for frosting; what a formula is scaled to. */
  readonly toMakeG: number;
};

/** One tier, the sheet, or one of a kind of cutting cake. */
export type PieceWeights = {
  readonly kind: 'tier' | 'sheet' | 'cutting-cake';
  /** From the board up, or into the design's cutting cakes. */
  readonly index: number;
  readonly count: number;
  /** Of one of them. */
  readonly parts: readonly WeighedPart[];
};

export type PartWeights = {
  readonly pieces: readonly PieceWeights[];
  /**
   * Everything of the order by part, cutting cakes and decorations put on by the studio included;
   * a part that is there but weighs next to nothing is listed all the same.
   */
  readonly parts: readonly WeighedPart[];
};

/**
 * What a design is made of, part by part, unrounded grams. Buttercream under fondant, dams, borders
 * and lettering are in their style; ganache and fondant are coverings. A covering that is only a
 * name for the buttercream (buttercream, semi-naked) weighs nothing and is not listed.
 */
export function partWeights(resolved: ResolvedDesign): PartWeights {
  const amounts = amountsOf(resolved);
  const kind = resolved.design.cake?.kind === 'sheet' ? 'sheet' : 'tier';
  const pieces: PieceWeights[] = [
    ...resolved.tiers.map((tier, index): PieceWeights => ({
      kind,
      index,
      count: 1,
      parts: partsOfBody(tier, amounts.perTier[index]),
    })),
    ...resolved.cuttingCakes.map((body, index): PieceWeights => ({
      kind: 'cutting-cake',
      index,
      count: body.count,
      parts: partsOfBody(body, amounts.perCuttingCake[index]),
    })),
  ];
  const sums = new Map<string, WeighedPart>();
  const add = (part: WeighedPart, times: number) => {
    const key = `${part.part}:${part.id}`;
    const before = sums.get(key);
    sums.set(key, {
      ...part,
      inCakeG: (before?.inCakeG ?? 0) + part.inCakeG * times,
      toMakeG: (before?.toMakeG ?? 0) + part.toMakeG * times,
    });
  };
  for (const piece of pieces) for (const part of piece.parts) add(part, piece.count);
  for (const it of resolved.decorations) {
    if (it.placed.source !== 'studio' || isPiped(it.decoration)) continue;
    const grams = it.decoration.weightG;
    add(
      { part: 'decoration', id: it.decoration.id, inCakeG: grams, toMakeG: grams },
      timesOf(it, resolved.tiers.length),
    );
  }
  return { pieces, parts: [...sums.values()] };
}

function partsOfBody(body: ResolvedBody, grams: BodyAmounts | undefined): WeighedPart[] {
  if (grams === undefined) return [];
  const parts: WeighedPart[] = [];
  const { sponge, filling, coating } = body;
  if (sponge !== null)
    parts.push({
      part: 'sponge',
      id: sponge.id,
      inCakeG: grams.spongeG,
      toMakeG: grams.batterG,
    });
  if (filling !== null && body.layers > 1)
    parts.push({
      part: 'filling',
      id: filling.id,
      inCakeG: grams.fillingG,
      toMakeG: grams.fillingG,
    });
  if (coating === null) return parts;
  const { style, covering } = coating;
  if (style !== null)
    parts.push({
      part: 'style',
      id: style.id,
      inCakeG: grams.frostingOnCakeG,
      toMakeG: grams.frostingG,
    });
  if (covering.id === 'fondant' || covering.id === 'ganache')
    parts.push({
      part: 'covering',
      id: covering.id,
      inCakeG: grams.coveringOnCakeG,
      toMakeG: grams.coveringG,
    });
  return parts;
}
