/** A wanted colour and what it comes out as, side by side; words beside it say which is which. */
export function ColourPair({
  wanted,
  reached,
  className = 'h-6 w-10',
}: {
  readonly wanted: string;
  readonly reached: string;
  readonly className?: string;
}) {
  return (
    <svg viewBox="0 0 40 24" className={`shrink-0 ${className}`} aria-hidden="true">
      <path d="M20 1H12a11 11 0 0 0 0 22h8z" fill={wanted} />
      <path d="M20 1h8a11 11 0 0 1 0 22h-8z" fill={reached} />
      <path
        d="M12 1h16a11 11 0 0 1 0 22H12a11 11 0 0 1 0-22zM20 1v22"
        fill="none"
        stroke="var(--color-slate)"
      />
    </svg>
  );
}
