import type { Cake } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { formatLength, type LengthLead } from './measures.ts';
import { capitalise } from './sentences.ts';
import { blocksOf, boardOf, type Block } from './sizes.ts';
import { supportsOf, type DowelSet } from './supports.ts';
import { tierName } from './tier-name.ts';

export type SupportRow = { readonly name: string; readonly lines: readonly string[] };

/**
 * What stands under and in each tier, for whoever stacks and boxes the cake, from the board up; both
 * units, the studio's first. Throws `UnknownPart` where the menu has lost the sheet's size.
 */
export function supportRows(cake: Cake, menu: Menu): SupportRow[] {
  const lead = menu.studio.lengthLead;
  const board = boardOf(cake, menu);
  const blocks = blocksOf(cake, menu);
  const bodies = blocks.map((block, at) => ({ block, real: cake.tiers[at]?.real ?? true }));
  const rows = supportsOf(bodies, menu.kitchen).perTier.map(
    ({ tier, board: card, innerBoard, dowels }) => {
      const lines = [
        ...(card === null ? [] : [`On a card of its own size, ${sizeOf(card, lead)}.`]),
        ...(innerBoard === null
          ? []
          : [`A board inside, ${formatLength(innerBoard.atMm, lead)} above its foot.`]),
        ...dowels.map((it) => dowelWords(it, lead)),
      ];
      return { name: tierName(tier, bodies.length), lines };
    },
  );
  const whole =
    board === null ? [] : [{ name: 'Cake board', lines: [`${capitalise(sizeOf(board, lead))}.`] }];
  return [...whole, ...rows.filter((it) => it.lines.length > 0)];
}

function sizeOf({ shape, widthMm, depthMm }: Omit<Block, 'heightMm'>, lead: LengthLead): string {
  const across = formatLength(widthMm, lead);
  const size = widthMm === depthMm ? across : `${across} by ${formatLength(depthMm, lead)}`;
  return `${shape}, ${size}`;
}

function dowelWords({ bears, count, lengthMm }: DowelSet, lead: LengthLead): string {
  const under = bears === 'inner-board' ? 'the board inside' : 'the tier above';
  return `${count} dowels of ${formatLength(lengthMm, lead)} under ${under}.`;
}
