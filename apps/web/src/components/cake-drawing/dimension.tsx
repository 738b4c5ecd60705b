type Props = {
  /** From, to: along the line. */
  readonly from: number;
  readonly to: number;
  /** Where the line lies across. */
  readonly at: number;
  readonly text: string;
  readonly upright?: boolean;
  /** On which side of the line the figure stands. */
  readonly side?: 'before' | 'after';
};

const tick = 5;

/** A dimension line with its end strokes and its figure, as on a plan. */
export function Dimension({ from, to, at, text, upright = false, side = 'after' }: Props) {
  const middle = (from + to) / 2;
  const offset = side === 'after' ? 17 : -8;
  return (
    <g stroke="var(--color-cobalt)" strokeWidth="1">
      {upright ? (
        <path
          d={`M${at} ${from}V${to}M${at - tick} ${from}h${tick * 2}M${at - tick} ${to}h${tick * 2}`}
        />
      ) : (
        <path
          d={`M${from} ${at}H${to}M${from} ${at - tick}v${tick * 2}M${to} ${at - tick}v${tick * 2}`}
        />
      )}
      <text
        fill="var(--color-cobalt)"
        stroke="none"
        textAnchor="middle"
        fontSize="13"
        transform={
          upright
            ? `translate(${at + offset - 4} ${middle}) rotate(90)`
            : `translate(${middle} ${at + offset})`
        }
        dy={upright ? '0' : undefined}
      >
        {text}
      </text>
    </g>
  );
}
