import { useState } from 'react';
import type { Coating } from '#shared/contracts/design.ts';
import { tierName } from '#shared/kitchen/tier-name.ts';
import { Fold } from '#web/components/ui/fold.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { coatTier } from '../../design/choose-coat.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { CoatColourFields } from './coat-colour-fields.tsx';

/** Another colour on one tier, behind a fold: most cakes wear one. */
export function TierColours() {
  const { cake } = useWizard().values;
  const coloured = cake.tiers.findIndex(
    (it) => it.coating !== null && it.coating.colour !== cake.coating?.colour,
  );
  const [at, setAt] = useState<number | null>(coloured < 0 ? null : coloured);
  if (cake.kind === 'sheet' || cake.tiers.length < 2 || cake.coating === null) return null;
  const tier = at === null ? undefined : cake.tiers[at];
  const coating = tier?.coating ?? cake.coating;
  return (
    <Fold label="Another color on one tier" open={coloured >= 0}>
      <div className="grid gap-5">
        <Select
          label="Which tier"
          className="max-w-60"
          value={at ?? ''}
          onChange={(event) => setAt(event.target.value === '' ? null : Number(event.target.value))}
        >
          <option value="">Choose one</option>
          {cake.tiers
            .map((_, index) => (
              <option key={index} value={index}>
                {tierName(index, cake.tiers.length)}
              </option>
            ))
            .toReversed()}
        </Select>
        {at !== null && tier !== undefined && <TierColour key={at} at={at} coating={coating} />}
      </div>
    </Fold>
  );
}

function TierColour({ at, coating }: { readonly at: number; readonly coating: Coating }) {
  const { values, change } = useWizard();
  const { cake } = values;
  const name = tierName(at, cake.tiers.length).toLowerCase();
  return (
    <CoatColourFields
      coating={coating}
      name={`cake.tiers.${at}.coating.colour`}
      legend={`Color of the ${name}`}
      ownLabel={`Another color for the ${name}`}
      onCoating={(next, undo) => {
        const like = JSON.stringify(next) === JSON.stringify(cake.coating);
        change({ cake: coatTier(cake, at, like ? null : next) }, undo);
      }}
    />
  );
}
