import { readableOn } from '#web/components/coats/shades.ts';
import type { Box } from './layout.ts';

/** A letter of the piping hand is about this wide against its height. */
const letterWidth = 0.52;
const largest = 17;

/** Words on a cake, as large as fits; a drawing of where they go, not of the hand. */
export function PipedWords({
  box,
  text,
  ground,
}: {
  readonly box: Box;
  readonly text: string;
  readonly ground: string;
}) {
  const trimmed = text.trim();
  if (trimmed === '') return null;
  const room = box.width - 14;
  const size = Math.min(
    largest,
    box.height * 0.34,
    room / (Math.max(3, trimmed.length) * letterWidth),
  );
  return (
    <text
      x={box.x + box.width / 2}
      y={box.y + box.height / 2 + size * 0.34}
      textAnchor="middle"
      fontSize={size}
      fontStyle="italic"
      fontWeight="600"
      fill={readableOn(ground)}
    >
      {trimmed}
    </text>
  );
}
