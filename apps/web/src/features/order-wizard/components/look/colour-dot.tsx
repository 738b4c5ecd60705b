/** A dot of a colour beside its name. */
export function ColourDot({
  colour,
  large = false,
}: {
  readonly colour: string;
  readonly large?: boolean;
}) {
  return (
    <svg
      viewBox="0 0 20 20"
      className={`shrink-0 ${large ? 'size-9' : 'size-5'}`}
      aria-hidden="true"
    >
      <circle cx="10" cy="10" r="9" fill={colour} stroke="var(--color-slate)" strokeWidth="1" />
    </svg>
  );
}
