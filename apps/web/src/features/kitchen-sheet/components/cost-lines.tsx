import type { CostLine, OrderCost } from '#shared/contracts/kitchen-sheet.ts';
import { formatDuration } from '#shared/dates/format.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { gramsText } from '#web/lib/grams-text.ts';
import { costWords } from './cost-words.ts';

type Props = { readonly cost: OrderCost; readonly locale: string };

/** Each line with what is in it; adds up to the total. */
export function CostLines({ cost, locale }: Props) {
  const money = (minor: number) => formatMoney(minor, cost.currency, locale);
  return (
    <div className="grid gap-5">
      {cost.lines
        .filter((it) => it.kind !== 'overhead')
        .map((line) => (
          <section key={line.kind} className="grid gap-1">
            <h3 className="flex items-baseline justify-between gap-4 text-base">
              <span>{costWords[line.kind]}</span>
              <span className="tabular-nums">{money(line.amountMinor)}</span>
            </h3>
            <ul>
              {line.items.map((item, at) => (
                <li
                  key={`${at} ${item.label}`}
                  className="flex items-baseline justify-between gap-4 border-b border-seam py-1 text-sm"
                >
                  <span className="min-w-0">
                    {item.label}
                    <span className="text-slate">{howMuch(item, locale)}</span>
                  </span>
                  <span className="shrink-0 tabular-nums">
                    {item.amountMinor === null ? (
                      <strong>not known</strong>
                    ) : (
                      money(item.amountMinor)
                    )}
                  </span>
                </li>
              ))}
            </ul>
          </section>
        ))}
    </div>
  );
}

function howMuch(item: CostLine['items'][number], locale: string): string {
  if (item.grams !== null) return `, ${gramsText(item.grams, locale)}`;
  if (item.minutes !== null) return `, ${formatDuration(item.minutes)}`;
  return item.count !== null && item.count > 1 ? `, ${item.count}` : '';
}
