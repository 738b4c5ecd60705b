import type { PriceBookContent } from '#shared/contracts/prices.ts';
import { Fieldset } from '#web/components/ui/fieldset.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { usePriceDraft } from '../draft/price-draft.ts';
import { AmountField } from './price-fields.tsx';

const kinds = [
  { field: 'spongeSurcharges', things: 'sponges', legend: 'Sponges' },
  { field: 'fillingSurcharges', things: 'fillings', legend: 'Fillings' },
  { field: 'styleSurcharges', things: 'styles', legend: 'Buttercreams' },
  { field: 'coveringSurcharges', things: 'coverings', legend: 'Coverings' },
] as const;

/** The same prices with one of them changed; nothing more to pay is no entry at all. */
export function withPrice(
  prices: PriceBookContent['extraPrices'],
  id: string,
  minor: number | null,
): PriceBookContent['extraPrices'] {
  const { [id]: _, ...others } = prices;
  return minor === null ? others : { ...others, [id]: minor };
}

/** What a portion costs more for what it is made of. */
export function Surcharges() {
  const { content, prices, put } = usePriceDraft();
  return (
    <Section title="More for what it is made of">
      <p className="text-slate">A portion, on top of the above. Nothing is 0.</p>
      <div className="grid gap-8">
        {kinds.map(({ field, things, legend }) => (
          <Fieldset key={field} legend={legend}>
            <div className="grid gap-x-6 gap-y-4 grid-cols-[repeat(auto-fill,minmax(10rem,1fr))] items-end">
              {prices[things].map(({ id, name }) => (
                <AmountField
                  key={id}
                  place={`${field}.${id}`}
                  label={name}
                  value={content[field][id] ?? 0}
                  onValue={(minor) =>
                    put({ [field]: withPrice(content[field], id, minor === 0 ? null : minor) })
                  }
                />
              ))}
            </div>
          </Fieldset>
        ))}
      </div>
    </Section>
  );
}
