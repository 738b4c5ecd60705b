import { formatMoney } from '#shared/kitchen/money.ts';
import { workedOutDecorationPrice } from '#shared/kitchen/decoration-price.ts';
import { Fieldset } from '#web/components/ui/fieldset.tsx';
import { NumberField } from '#web/components/ui/number-field.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { readAmount, writeAmount } from '../draft/figures.ts';
import { usePriceDraft } from '../draft/price-draft.ts';
import { AmountField, ShareField } from './price-fields.tsx';
import { withPrice } from './surcharges.tsx';

const per = { piece: 'each', tier: 'a tier', cake: 'a cake' } as const;

/** Decorations by the time and materials they take, or at a price of their own; and extras. */
export function DecorationPrices() {
  const { content, prices, put, problemAt, menu } = usePriceDraft();
  const { currency } = content;
  const money = (minor: number) => formatMoney(minor, currency, menu.studio.locale);
  return (
    <Section title="Decorations and extras">
      <div className="grid grid-cols-[repeat(auto-fill,minmax(10rem,1fr))] items-end gap-5">
        <AmountField
          place="decoratingPerHourMinor"
          label="An hour of decorating sells for"
          value={content.decoratingPerHourMinor}
          onValue={(decoratingPerHourMinor) => put({ decoratingPerHourMinor })}
        />
        <ShareField
          place="materialsMarkupPpm"
          label="On top of what materials cost"
          value={content.materialsMarkupPpm}
          onValue={(materialsMarkupPpm) => put({ materialsMarkupPpm })}
        />
      </div>
      <Fieldset
        legend="Decorations"
        hint="Priced by their minutes and materials; write a price only where another shall hold."
      >
        <ul className="grid gap-x-8 divide-y divide-seam sm:grid-cols-2 sm:divide-y-0">
          {prices.decorations.map((it) => {
            const worked = workedOutDecorationPrice(it, content);
            const place = `decorationPrices.${it.id}`;
            return (
              <li key={it.id} className="py-3 sm:border-b sm:border-seam">
                <NumberField
                  name={place}
                  label={`${it.name}, ${per[it.per]}`}
                  hint={`${it.minutes} min and ${money(it.materialsCostMinor)} of materials: ${Number.isNaN(worked) ? '…' : money(worked)}`}
                  error={problemAt(place)}
                  inputMode="decimal"
                  className="max-w-28 tabular-nums"
                  unit={currency}
                  read={(text) => readAmount(text, currency)}
                  write={(minor) => writeAmount(minor, currency)}
                  value={content.decorationPrices[it.id] ?? null}
                  onValue={(minor) =>
                    put({ decorationPrices: withPrice(content.decorationPrices, it.id, minor) })
                  }
                />
              </li>
            );
          })}
        </ul>
      </Fieldset>
      <Fieldset legend="Beside the cake">
        <div className="grid gap-x-6 gap-y-4 grid-cols-[repeat(auto-fill,minmax(10rem,1fr))] items-end">
          {prices.extras.map(({ id, name }) => (
            <AmountField
              key={id}
              place={`extraPrices.${id}`}
              label={name}
              value={content.extraPrices[id] ?? 0}
              onValue={(minor) => put({ extraPrices: withPrice(content.extraPrices, id, minor) })}
            />
          ))}
        </div>
      </Fieldset>
    </Section>
  );
}
