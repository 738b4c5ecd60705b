import { Section } from '#web/components/ui/section.tsx';
import { usePriceDraft } from '../draft/price-draft.ts';
import { BandRows } from './band-rows.tsx';
import { AmountField, WidthField } from './price-fields.tsx';

const finishNames = { smooth: 'Smooth', textured: 'Textured', piped: 'Piped' } as const;

/** What the cake itself costs: tiers by band, sheets, dummies, finishes, words. */
export function PortionPrices() {
  const { content, put } = usePriceDraft();
  const { tierBands, finishes } = content;
  return (
    <Section title="The cake, by the portion">
      <BandRows
        legend="Tiers, by their widest side"
        hint="Smallest first; a tier takes the first band it fits, the widest the last."
        place="tierBands"
        rows={tierBands}
        onRows={(rows) => put({ tierBands: rows })}
        fresh={() => ({
          upToMm: (tierBands.at(-1)?.upToMm ?? 150) + 50,
          perPortionMinor: tierBands.at(-1)?.perPortionMinor ?? 0,
        })}
        addLabel="Add a band"
        nameOf={(at) => `band ${at + 1}`}
      >
        {(band, at, change) => (
          <>
            <WidthField
              place={`tierBands.${at}.upToMm`}
              label="Up to"
              value={band.upToMm}
              onValue={(upToMm) => change({ upToMm })}
            />
            <AmountField
              place={`tierBands.${at}.perPortionMinor`}
              label="A portion"
              value={band.perPortionMinor}
              onValue={(perPortionMinor) => change({ perPortionMinor })}
            />
          </>
        )}
      </BandRows>
      <div className="grid gap-5 grid-cols-[repeat(auto-fill,minmax(10rem,1fr))] items-end">
        <AmountField
          place="sheetPerPortionMinor"
          label="Sheets and cutting cakes, a portion"
          value={content.sheetPerPortionMinor}
          onValue={(sheetPerPortionMinor) => put({ sheetPerPortionMinor })}
        />
        <AmountField
          place="dummyTierMinor"
          label="A dummy tier"
          value={content.dummyTierMinor}
          onValue={(dummyTierMinor) => put({ dummyTierMinor })}
        />
        <AmountField
          place="wordsMinor"
          label="Words, each line of them"
          value={content.wordsMinor}
          onValue={(wordsMinor) => put({ wordsMinor })}
        />
        {finishes.map((finish, at) => (
          <AmountField
            key={finish.id}
            place={`finishes.${at}.perPortionMinor`}
            label={`${finishNames[finish.id]} finish, a portion`}
            value={finish.perPortionMinor}
            onValue={(perPortionMinor) =>
              put({
                finishes: finishes.map((it, index) =>
                  index === at ? { ...it, perPortionMinor } : it,
                ),
              })
            }
          />
        ))}
      </div>
    </Section>
  );
}
