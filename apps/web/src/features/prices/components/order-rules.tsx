import { Section } from '#web/components/ui/section.tsx';
import { usePriceDraft } from '../draft/price-draft.ts';
import { BandRows } from './band-rows.tsx';
import { AmountField, DaysField, ShareField } from './price-fields.tsx';

/** What holds for a whole order: short notice, the smallest, rounding, deposit and balance. */
export function OrderRules() {
  const { content, put } = usePriceDraft();
  const { rush } = content;
  return (
    <Section title="The order as a whole">
      <BandRows
        legend="Short notice"
        hint="The tightest that covers the day counts; it adds its share of the cake."
        place="rush"
        rows={rush}
        onRows={(rows) => put({ rush: rows })}
        fresh={() => ({ underDays: (rush.at(-1)?.underDays ?? 0) + 4, addPpm: 100_000 })}
        addLabel="Add short notice"
        nameOf={(at) => `short notice ${at + 1}`}
      >
        {(band, at, change) => (
          <>
            <DaysField
              place={`rush.${at}.underDays`}
              label="Under"
              value={band.underDays}
              onValue={(underDays) => change({ underDays })}
            />
            <ShareField
              place={`rush.${at}.addPpm`}
              label="Adds"
              value={band.addPpm}
              onValue={(addPpm) => change({ addPpm })}
            />
          </>
        )}
      </BandRows>
      <div className="grid grid-cols-[repeat(auto-fill,minmax(10rem,1fr))] items-end gap-5">
        <AmountField
          place="minimumMinor"
          label="No cake is sold for less than"
          value={content.minimumMinor}
          onValue={(minimumMinor) => put({ minimumMinor })}
        />
        <AmountField
          place="roundToMinor"
          label="Totals are rounded to a whole"
          value={content.roundToMinor}
          onValue={(roundToMinor) => put({ roundToMinor })}
        />
        <ShareField
          place="depositPpm"
          label="Deposit"
          hint="0 asks for none."
          value={content.depositPpm}
          onValue={(depositPpm) => put({ depositPpm })}
        />
        <AmountField
          place="depositFloorMinor"
          label="Deposit, at least"
          value={content.depositFloorMinor}
          onValue={(depositFloorMinor) => put({ depositFloorMinor })}
        />
        <DaysField
          place="balanceDueDays"
          label="The rest is due before pickup by"
          value={content.balanceDueDays}
          onValue={(balanceDueDays) => put({ balanceDueDays })}
        />
      </div>
    </Section>
  );
}
