type Props = {
  /** What is counted: "Sweetness". */
  readonly label: string;
  readonly value: number;
  readonly of?: number;
  /** Hides the label to the eye where a heading already says it. */
  readonly bare?: boolean;
};

/** A small scale: five dots, so many filled. */
export function Dots({ label, value, of = 5, bare = false }: Props) {
  return (
    <span className="inline-flex items-center gap-1.5 whitespace-nowrap">
      {!bare && <span aria-hidden="true">{label}</span>}
      <svg
        viewBox={`0 0 ${of * 12} 12`}
        className="h-2.5"
        role="img"
        aria-label={`${label} ${value} of ${of}`}
      >
        {Array.from({ length: of }, (_, at) => (
          <circle
            key={at}
            cx={at * 12 + 6}
            cy="6"
            r="4.2"
            fill={at < value ? 'var(--color-ink)' : 'none'}
            stroke="var(--color-ink)"
            strokeWidth="1.4"
          />
        ))}
      </svg>
    </span>
  );
}
