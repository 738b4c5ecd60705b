/** Text the studio wrote: a blank line parts paragraphs, line breaks stay. */
export function Prose({ text }: { readonly text: string }) {
  return (
    <div className="measure grid gap-3">
      {text
        .split(/\n\s*\n/)
        .map((it) => it.trim())
        .filter((it) => it !== '')
        .map((paragraph, at) => (
          <p key={at} className="whitespace-pre-line">
            {paragraph}
          </p>
        ))}
    </div>
  );
}
