import { formatLength, type LengthLead } from '../measures.ts';
import type { Ring } from '../sizes.ts';
import type { BlockCut } from './cut-block.ts';

const pieces = (count: number): string => `${count} ${count === 1 ? 'piece' : 'pieces'}`;

/** How a piece of cake is cut, a sentence a step; both units, the studio's first. */
export function cuttingSteps(
  left: 'dummy' | 'keepsake' | null,
  cut: BlockCut | null,
  lead: LengthLead,
): string[] {
  if (cut === null || left === 'dummy') return ['No cake inside: set it aside, do not cut it.'];
  const kept = left === 'keepsake' ? ['Kept back: box it whole. When it is eaten:'] : [];
  const each = cut.grid === null ? ringSteps(cut.rings, lead) : gridSteps(cut, lead);
  if (cut.decks === 1) return [...kept, ...each];
  const halfway = formatLength(cut.block.heightMm / 2, lead);
  return [
    ...kept,
    `There is a board inside, ${halfway} up. Cut down to it first; lift it out, then cut the lower half the same way.`,
    ...each,
    `That is ${cut.perDeck} from each half, ${pieces(cut.portions)} in all.`,
  ];
}

function ringSteps(rings: readonly Ring[], lead: LengthLead): string[] {
  return rings.map(({ outerMm, innerMm, pieces: count }, n) => {
    const along = formatLength((2 * Math.PI * outerMm) / Math.max(1, count), lead);
    if (innerMm > 0) {
      const inwards = formatLength(outerMm - innerMm, lead);
      const from = n === 0 ? 'in from the edge' : 'further in';
      return `Cut a circle ${inwards} ${from} and slice that ring into ${pieces(count)}, each about ${along} wide outside.`;
    }
    const across = formatLength(2 * outerMm, lead);
    const core = rings.length === 1 ? 'The cake' : `The core, ${across} across,`;
    if (count === 0) return `${core} is too small for a portion: the cook's.`;
    return count === 1 ? `${core} is one piece.` : `${core} is cut in ${count} wedges.`;
  });
}

function gridSteps({ grid, perDeck }: BlockCut, lead: LengthLead): string[] {
  if (grid === null) return [];
  const { columns, rows, pieceWidthMm, pieceDepthMm } = grid;
  if (perDeck === 0) return ['It is smaller than a portion: serve it whole.'];
  const strips =
    rows === 1
      ? 'One strip'
      : `Cut ${rows} strips from side to side, each ${formatLength(pieceDepthMm, lead)} deep`;
  const across = `${pieces(columns)} of ${formatLength(pieceWidthMm, lead)}`;
  return [
    `${strips}, and ${rows === 1 ? 'it' : 'each strip'} into ${across}: ${pieces(perDeck)}${rows === 1 ? '' : ` (${columns} by ${rows})`}.`,
  ];
}
