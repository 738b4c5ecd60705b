import { outlineOf } from '#web/components/coats/shades.ts';

/** A spoonful in a formula's own colour, on white as everything whose colour counts. */
export function FormulaDab({ colour }: { readonly colour: string | null }) {
  if (colour === null) return <span className="size-7 shrink-0" />;
  return (
    <svg viewBox="0 0 28 28" className="size-7 shrink-0" aria-hidden="true">
      <path
        d="M4 19c0-5 3-6 5-10 1-2.5 4-5 6-4 2.5 1.2 1.5 4 3.5 5.5 2.5 2 6.5 3 6.5 7.5 0 4-5 5.5-11 5.5S4 22.5 4 19z"
        fill={colour}
        strokeWidth="1.3"
        style={{ stroke: outlineOf(colour) }}
      />
    </svg>
  );
}
