import type { PayLever } from '#shared/contracts/kitchen-sheet.ts';

type Props = { readonly levers: readonly PayLever[] };

/** What would make it pay, each by itself; those that are enough alone first. */
export function Levers({ levers }: Props) {
  if (levers.length === 0) return null;
  const sorted = levers.toSorted((a, b) => Number(b.enough) - Number(a.enough));
  return (
    <section className="grid gap-2">
      <h3>What would make this pay</h3>
      <ul className="grid">
        {sorted.map((it) => (
          <li key={it.kind} className="border-b border-seam py-2">
            <p className="flex flex-wrap items-baseline justify-between gap-x-4">
              <strong>{it.title}</strong>
              <span className="text-sm text-slate">
                {it.enough ? 'enough by itself' : 'not enough by itself'}
              </span>
            </p>
            <p>{it.sentence}</p>
          </li>
        ))}
      </ul>
    </section>
  );
}
