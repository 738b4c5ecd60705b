import type { Shopping, ShoppingLineView } from '#shared/contracts/kitchen-sheet.ts';
import { groupBy } from '#shared/group-by.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { gramsText } from '#web/lib/grams-text.ts';

type Props = { readonly list: Shopping; readonly locale: string };

/** Families in the order somebody walks past them; what is not named comes last. */
const families: readonly (readonly [family: string, name: string])[] = [
  ['butter', 'Butter'],
  ['dairy', 'Dairy'],
  ['egg', 'Eggs'],
  ['flour', 'Flours'],
  ['starch', 'Starches'],
  ['sugar', 'Sugars'],
  ['chocolate', 'Chocolate and cocoa'],
  ['fruit', 'Fruit'],
  ['nut', 'Nuts'],
  ['fat', 'Oils and fats'],
  ['raising', 'Raising agents'],
  ['gelling', 'Gelling agents'],
  ['flavour', 'Flavors'],
  ['colour', 'Colors'],
  ['salt', 'Salt'],
  ['liquid', 'Liquids'],
  ['other', 'Other'],
];

/** What to buy, by shelf, in whole packs, with a box to tick on paper. */
export function ShoppingList({ list, locale }: Props) {
  const byFamily = groupBy(list.lines, (it) => it.family);
  return (
    <div className="gap-x-10 px-5 pt-5 sm:px-7 lg:columns-2 print:columns-2 print:p-0">
      {families.map(([family, name]) => {
        const lines = byFamily.get(family);
        if (lines === undefined) return null;
        return (
          <section key={family} className="mb-6 break-inside-avoid print:mb-3">
            <h2 className="text-lg">{name}</h2>
            <ul>
              {lines.map((line) => (
                <Line key={line.id} line={line} list={list} locale={locale} />
              ))}
            </ul>
          </section>
        );
      })}
    </div>
  );
}

function Line({ line, list, locale }: Props & { readonly line: ShoppingLineView }) {
  return (
    <li className="grid grid-cols-[1.25rem_minmax(0,1fr)_auto] items-baseline gap-x-3 border-b border-seam py-2">
      <svg viewBox="0 0 16 16" className="w-4 self-center" aria-hidden="true">
        <rect
          x="1"
          y="1"
          width="14"
          height="14"
          rx="3"
          fill="none"
          stroke="var(--color-slate)"
          strokeWidth="1.5"
        />
      </svg>
      <span className="min-w-0">
        <span className="font-semibold">{packsText(line, locale)}</span> {line.name}
        <span className="block text-sm text-slate">{needText(line, locale)}</span>
      </span>
      <span className="text-right tabular-nums">
        {line.buyMinor === null ? (
          <span className="text-sm">price not known</span>
        ) : (
          formatMoney(line.buyMinor, list.currency, locale)
        )}
      </span>
    </li>
  );
}

function packsText({ packs, packG, eggs }: ShoppingLineView, locale: string): string {
  if (packs === null) return '';
  if (eggs !== null || packG === null) return `${packs} ×`;
  return `${packs} × ${gramsText(packG, locale)}`;
}

function needText(line: ShoppingLineView, locale: string): string {
  const brand = line.brand === null ? '' : `${line.brand}. `;
  if (line.eggs !== null) return `${brand}${line.eggs} to crack`;
  const left =
    line.leftG === null || line.leftG < 1 ? '' : `, ${gramsText(line.leftG, locale)} left`;
  return `${brand}${gramsText(line.grams, locale)} needed${left}`;
}
