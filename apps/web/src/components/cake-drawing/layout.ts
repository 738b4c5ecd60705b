import type { Cake, Look, Tier } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { boardOf } from '#shared/kitchen/sizes.ts';

/** A rectangle of the drawing, in its own units; y grows downwards. */
export type Box = {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
};

export type TierBox = Box & { readonly tier: Tier };

export type TieredLayout = {
  /** Units of the drawing per millimetre. */
  readonly scale: number;
  /** From the board up. */
  readonly tiers: readonly TierBox[];
  readonly board: Box;
  readonly top: number;
};

/** The room a cake is drawn into. */
export type Room = Box;

/** The cake itself, or the names and dimension lines about it. */
export type Shown = 'cake' | 'measures';

/** What a view of a cake is drawn from. */
export type ViewProps = {
  readonly cake: Cake;
  readonly look: Look | null;
  readonly menu: Menu;
  readonly room: Room;
  readonly show: Shown;
  /** Id of the hatching, for dummies. */
  readonly hatch: string;
};

/** The topmost dimension line lies so far above what it measures. */
export const measureGap = 18;

/** A small cake is not blown up to fill the page: this many units a millimetre at most. */
const largestScale = 1.05;

/** Below this the board would be a hair; it is drawn a little stronger than to scale. */
const thinnestBoard = 4;

/**
 * Lays a tiered cake into the room, to one scale across and up, standing at the room's foot in its
 * middle.
 */
export function layOutTiers(cake: Cake, menu: Menu, room: Room): TieredLayout {
  const board = boardOf(cake, menu);
  const boardWidthMm = board?.widthMm ?? 300;
  const heightMm = cake.tiers.reduce((sum, tier) => sum + tier.heightMm, 0);
  const scale = Math.min(
    largestScale,
    room.width / boardWidthMm,
    (room.height - thinnestBoard) / Math.max(1, heightMm),
  );
  const middle = room.x + room.width / 2;
  const boardHeight = Math.max(thinnestBoard, (board?.heightMm ?? 0) * scale * 0.6);
  const floor = room.y + room.height;
  const boardBox = {
    x: middle - (boardWidthMm * scale) / 2,
    y: floor - boardHeight,
    width: boardWidthMm * scale,
    height: boardHeight,
  };
  let top = boardBox.y;
  const tiers = cake.tiers.map((tier) => {
    const height = tier.heightMm * scale;
    const width = tier.widthMm * scale;
    top -= height;
    return { tier, x: middle - width / 2, y: top, width, height };
  });
  return { scale, tiers, board: boardBox, top };
}
