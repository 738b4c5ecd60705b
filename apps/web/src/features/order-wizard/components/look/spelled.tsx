import { spellBack, spelledWords } from '../../words/spelled.ts';

/** The words sign by sign, the way they will be piped; read out with capitals and spaces named. */
export function Spelled({ text }: { readonly text: string }) {
  const signs = spellBack(text);
  if (signs.length === 0) return null;
  return (
    <p dir="auto" className="flex flex-wrap gap-y-1">
      <span className="sr-only">Spelled: {signs.map((it) => it.said).join(', ')}.</span>
      {spelledWords(signs).map((word, at) => (
        <span key={at} aria-hidden="true" className="inline-flex">
          {word.map(({ sign }, place) => (
            <span
              key={place}
              className="grid min-w-6 place-items-center border-b-2 border-seam px-0.5 font-display text-lg font-semibold"
            >
              {sign === ' ' ? <span className="text-sm font-normal text-slate">·</span> : sign}
            </span>
          ))}
        </span>
      ))}
    </p>
  );
}
