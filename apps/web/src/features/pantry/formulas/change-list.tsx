import type { VersionChange } from '#shared/kitchen/formulas/compare-versions.ts';

type Props = {
  readonly changes: readonly VersionChange[];
  readonly none?: string;
};

/** What one version does otherwise than another, most telling first. */
export function ChangeList({ changes, none = 'Nothing: the two are alike.' }: Props) {
  if (changes.length === 0) return <p className="text-slate">{none}</p>;
  return (
    <ul className="grid gap-1.5">
      {changes.map((it) => (
        <li key={`${it.kind} ${it.text}`} className="flex gap-2.5">
          <span
            className="mt-[0.6em] size-1.5 shrink-0 rounded-round bg-cobalt"
            aria-hidden="true"
          />
          <span className="min-w-0">{it.text}</span>
        </li>
      ))}
    </ul>
  );
}
