type Props = { readonly part: 'whole' | 'white' | 'yolk' };

/** An egg in the shell, its white, or its yolk; said in words beside it. */
export function EggGlyph({ part }: Props) {
  return (
    <svg viewBox="0 0 24 24" className="size-6 shrink-0" aria-hidden="true">
      {part === 'whole' && (
        <path
          d="M12 3c3.8 0 7 5.6 7 10.4A7 7 0 0 1 5 13.4C5 8.6 8.2 3 12 3z"
          fill="var(--color-enamel)"
          stroke="var(--color-ink)"
          strokeWidth="1.6"
        />
      )}
      {part === 'white' && (
        <path
          d="M4 13c-1-4 3-4 4-7s6-3 7 0 6 2 6 6-3 4-4 6-5 2-7 1-5-2-6-6z"
          fill="var(--color-cloud)"
          stroke="var(--color-ink)"
          strokeWidth="1.6"
          strokeLinejoin="round"
        />
      )}
      {part === 'yolk' && (
        <circle
          cx="12"
          cy="12"
          r="6.4"
          fill="var(--color-butter)"
          stroke="var(--color-ink)"
          strokeWidth="1.6"
        />
      )}
    </svg>
  );
}
