/** The colours taken from a photo, as swatches with their figures. */
export function Palette({ colours }: { readonly colours: readonly string[] }) {
  if (colours.length === 0) return null;
  return (
    <ul aria-label="Colors in it" className="flex flex-wrap gap-x-3 gap-y-1 text-xs tabular-nums">
      {colours.map((colour) => (
        <li key={colour} className="inline-flex items-center gap-1.5">
          <span
            aria-hidden="true"
            className="size-5 rounded-mark border border-slate"
            style={{ background: colour }}
          />
          {colour}
        </li>
      ))}
    </ul>
  );
}
