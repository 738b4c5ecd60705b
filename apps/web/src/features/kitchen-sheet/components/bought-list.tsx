import type { KitchenSheet } from '#shared/contracts/kitchen-sheet.ts';
import { figure } from '#web/lib/figure.ts';
import { gramsText } from '#web/lib/grams-text.ts';

type Props = { readonly ingredients: KitchenSheet['ingredients']; readonly locale: string };

/** Everything bought that goes in, through all formulas, heaviest first. */
export function BoughtList({ ingredients, locale }: Props) {
  return (
    <ul className="grid gap-x-10 sm:grid-cols-2 print:block print:columns-2">
      {ingredients.map((it) => (
        <li
          key={it.id}
          className="grid grid-cols-[5.5rem_minmax(0,1fr)_auto] gap-x-4 border-b border-seam py-1.5 break-inside-avoid print:py-1"
        >
          <span className="text-right font-semibold whitespace-nowrap tabular-nums">
            {gramsText(it.grams, locale)}
          </span>
          <span className="min-w-0">{it.name}</span>
          <span className="text-sm whitespace-nowrap text-slate tabular-nums">
            {it.packs === null ? 'no pack known' : packsText(it.packs, locale)}
          </span>
        </li>
      ))}
    </ul>
  );
}

function packsText(packs: number, locale: string): string {
  const digits = packs < 10 ? 1 : 0;
  const shown = figure(packs, locale, digits);
  if (packs < 0.05) return 'a little of a pack';
  return `${shown} ${shown === '1' ? 'pack' : 'packs'}`;
}
