import { Section } from '#web/components/ui/section.tsx';
import { usePriceDraft } from '../draft/price-draft.ts';
import { BandRows } from './band-rows.tsx';
import { AmountField, ShareField, WidthField } from './price-fields.tsx';

/** What a cake costs the studio; never shown to a customer. */
export function CostFields() {
  const { content, put } = usePriceDraft();
  const { packaging } = content;
  const last = packaging.at(-1);
  return (
    <Section title="What it costs you">
      <p className="text-slate">
        For the margin beside each order; customers never see it. Ingredients count at the price of
        their packs, in the pantry.
      </p>
      <div className="grid gap-5 grid-cols-[repeat(auto-fill,minmax(10rem,1fr))] items-end">
        <AmountField
          place="labourPerHourMinor"
          label="An hour at the bench"
          value={content.labourPerHourMinor}
          onValue={(labourPerHourMinor) => put({ labourPerHourMinor })}
        />
        <ShareField
          place="overheadPpm"
          label="Overhead on top of the cost"
          hint="Rent, power, insurance."
          value={content.overheadPpm}
          onValue={(overheadPpm) => put({ overheadPpm })}
        />
        <ShareField
          place="targetMarginPpm"
          label="Margin to aim for"
          hint="Of the price without tax."
          value={content.targetMarginPpm}
          onValue={(targetMarginPpm) => put({ targetMarginPpm })}
        />
      </div>
      <BandRows
        legend="Boxes and boards, by their widest side"
        hint="One box a cake, one board under each tier. Without any, their cost counts as unknown."
        place="packaging"
        rows={packaging}
        onRows={(rows) => put({ packaging: rows })}
        fresh={() => ({
          upToMm: (last?.upToMm ?? 150) + 50,
          boxMinor: last?.boxMinor ?? 0,
          boardMinor: last?.boardMinor ?? 0,
        })}
        addLabel="Add a size"
        nameOf={(at) => `box and board ${at + 1}`}
      >
        {(band, at, change) => (
          <>
            <WidthField
              place={`packaging.${at}.upToMm`}
              label="Up to"
              value={band.upToMm}
              onValue={(upToMm) => change({ upToMm })}
            />
            <AmountField
              place={`packaging.${at}.boxMinor`}
              label="Box"
              value={band.boxMinor}
              onValue={(boxMinor) => change({ boxMinor })}
            />
            <AmountField
              place={`packaging.${at}.boardMinor`}
              label="Board"
              value={band.boardMinor}
              onValue={(boardMinor) => change({ boardMinor })}
            />
          </>
        )}
      </BandRows>
    </Section>
  );
}
