import { taxCategories } from '#shared/kitchen/tax.ts';
import { RadioGroup } from '#web/components/ui/radio-group.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { usePriceDraft } from '../draft/price-draft.ts';
import { BandRows } from './band-rows.tsx';
import { ShareField } from './price-fields.tsx';

const categoryNames: Readonly<Record<string, string>> = {
  cake: 'Cakes',
  goods: 'Candles and other goods',
  delivery: 'Delivery',
};

/** Currency, and tax inside the prices or on top of them. */
export function TaxFields() {
  const { content, prices, put, problemAt } = usePriceDraft();
  const { taxes } = content;
  const known = [...new Set([...Object.values(taxCategories), ...taxes.map((it) => it.category)])];
  return (
    <Section title="Currency and tax">
      {prices.currencyFixed ? (
        <p>
          Prices are in <strong>{content.currency}</strong>; since the first order that stays.
        </p>
      ) : (
        <TextField
          name="currency"
          label="Currency"
          hint="Its three letters; it stays once there is an order."
          error={problemAt('currency')}
          className="max-w-32 uppercase"
          maxLength={3}
          autoComplete="off"
          value={content.currency}
          onChange={(event) => put({ currency: event.target.value.toUpperCase() })}
        />
      )}
      <RadioGroup
        legend="The prices here"
        rows={[
          { value: 'on-top', label: 'are without tax, which comes on top' },
          { value: 'inside', label: 'have tax in them already' },
        ]}
        value={content.taxInclusive ? 'inside' : 'on-top'}
        onValue={(value) => put({ taxInclusive: value === 'inside' })}
      />
      <BandRows
        legend="Taxes"
        hint="A kind of goods without a tax of its own falls under the first. Ask your adviser which rate is yours."
        place="taxes"
        rows={taxes}
        onRows={(rows) => put({ taxes: rows })}
        fresh={() => ({
          category: known.find((it) => taxes.every((tax) => tax.category !== it)) ?? 'cake',
          name: 'Sales tax',
          ratePpm: 0,
        })}
        addLabel="Add a tax"
        nameOf={(at) => `the tax ${taxes[at]?.name ?? at + 1}`}
      >
        {(tax, at, change) => (
          <>
            <Select
              name={`taxes.${at}.category`}
              label="On"
              error={problemAt(`taxes.${at}.category`)}
              value={tax.category}
              onChange={(event) => change({ category: event.target.value })}
            >
              {known.map((it) => (
                <option key={it} value={it}>
                  {categoryNames[it] ?? it}
                </option>
              ))}
            </Select>
            <TextField
              name={`taxes.${at}.name`}
              label="Its name on the bill"
              error={problemAt(`taxes.${at}.name`)}
              autoComplete="off"
              maxLength={60}
              value={tax.name}
              onChange={(event) => change({ name: event.target.value })}
            />
            <ShareField
              place={`taxes.${at}.ratePpm`}
              label="Rate"
              value={tax.ratePpm}
              onValue={(ratePpm) => change({ ratePpm })}
            />
          </>
        )}
      </BandRows>
    </Section>
  );
}
