/** A dot of a colour beside its name. */
export function ColourDot({ colour }: { readonly colour: string }) {
  return (
    <svg viewBox="0 0 20 20" className="size-5 shrink-0" aria-hidden="true">
      <circle cx="10" cy="10" r="9" fill={colour} stroke="var(--color-slate)" strokeWidth="1" />
    </svg>
  );
}
