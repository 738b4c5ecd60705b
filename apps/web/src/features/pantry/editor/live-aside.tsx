import { memo } from 'react';
import type { Menu } from '#shared/contracts/menu.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { formatWeight } from '#shared/kitchen/measures.ts';
import { DataList } from '#web/components/ui/data-list.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { AllergenLine } from '../components/allergen-line.tsx';
import { ChangeList } from '../formulas/change-list.tsx';
import { Cautions } from '../formulas/formula-facts.tsx';
import { gramsText } from '#web/lib/grams-text.ts';
import { figure } from '#web/lib/figure.ts';
import type { Shelf } from '../shelf.ts';
import type { Inspected } from './inspect-form.ts';

type Props = {
  readonly inspected: Inspected;
  readonly shelf: Shelf;
  readonly house: Pick<Menu['studio'], 'locale' | 'labelRegion' | 'lengthLead'>;
  readonly percent: {
    readonly of: string | null;
    readonly choices: readonly { readonly value: string; readonly label: string }[];
    readonly onOf: (of: string | null) => void;
  };
  /** What the differences are told against: "version 3"; null where there is nothing. */
  readonly against: string | null;
};

/** What follows from what is typed, while it is typed. */
export const LiveAside = memo(function LiveAside(props: Props) {
  const { inspected, shelf, house, percent, against } = props;
  const { seen, unread, changes } = inspected;
  const { locale, lengthLead, labelRegion } = house;
  const money = (minor: number) => formatMoney(Math.round(minor), shelf.pantry.currency, locale);
  const perKg = seen.cost?.perKgOutMinor ?? null;
  return (
    <aside
      aria-label="What follows from it"
      className="grid content-start gap-5 lg:sticky lg:top-6"
    >
      <div>
        <p className="font-display text-3xl font-bold tabular-nums">
          {gramsText(seen.totals.outG, locale)}
        </p>
        <p className="text-sm text-slate">
          comes out of {gramsText(seen.totals.inG, locale)},{' '}
          {formatWeight(seen.totals.outG, lengthLead)}
          {seen.totals.outMl !== null && `, ${figure(seen.totals.outMl / 1000, locale, 1)} L`}
        </p>
      </div>
      {unread > 0 && (
        <Notice
          tone="butter"
          title={
            unread === 1 ? 'One line is not counted yet' : `${unread} lines are not counted yet`
          }
        >
          <p className="text-sm">Kept as typed, and marked in the list.</p>
        </Notice>
      )}
      <Cautions seen={seen} shelf={shelf} />
      <DataList
        rows={[
          {
            key: 'contains',
            label: 'Contains',
            value:
              seen.contents === null ? (
                'unknown until the lines are sound'
              ) : (
                <AllergenLine
                  allergens={seen.contents.allergens}
                  region={labelRegion}
                  none="No allergen of the list named"
                />
              ),
          },
          ...(shelf.pantry.can.seeCost
            ? [
                {
                  key: 'cost',
                  label: 'Costs',
                  value:
                    seen.cost === null
                      ? 'unknown until the lines are sound'
                      : perKg === null
                        ? `at least ${money(seen.cost.knownMinor)}`
                        : `${money(seen.cost.knownMinor)}, ${money(perKg)} a kilo`,
                },
              ]
            : []),
        ]}
      />
      <Select
        label="Percent beside the lines"
        value={percent.of ?? ''}
        onChange={(event) => percent.onOf(event.target.value === '' ? null : event.target.value)}
      >
        <option value="">of all that goes in</option>
        {percent.choices.map((it) => (
          <option key={it.value} value={it.value}>
            of {it.label}
          </option>
        ))}
      </Select>
      {against !== null && (
        <section className="grid gap-2">
          <h2 className="text-lg">What changed</h2>
          <p className="-mt-1 text-sm text-slate">against {against}</p>
          {changes === null ? (
            <p className="text-slate">Told once everything can be read.</p>
          ) : (
            <ChangeList changes={changes} none="Nothing yet." />
          )}
        </section>
      )}
    </aside>
  );
});
