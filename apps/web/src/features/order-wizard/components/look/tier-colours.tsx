import { useState } from 'react';
import { tierName } from '#shared/kitchen/tier-name.ts';
import { Fold } from '#web/components/ui/fold.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { coatTier } from '../../design/choose-coat.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { CoatColourFields } from './coat-colour-fields.tsx';

/** Another colour on one tier, behind a fold: most cakes wear one. */
export function TierColours() {
  const { values, change } = useWizard();
  const { cake } = values;
  const [at, setAt] = useState(Math.max(0, cake.tiers.length - 1));
  const tier = cake.tiers[at];
  const coating = tier?.coating ?? cake.coating;
  if (cake.kind === 'sheet' || cake.tiers.length < 2 || tier === undefined || coating === null) {
    return null;
  }
  const own = cake.tiers.some(
    (it) => it.coating !== null && it.coating.colour !== cake.coating?.colour,
  );
  const name = tierName(at, cake.tiers.length);
  return (
    <Fold label="Another color on one tier" open={own}>
      <div className="grid gap-5">
        <Select
          label="Which tier"
          className="max-w-60"
          value={at}
          onChange={(event) => setAt(Number(event.target.value))}
        >
          {cake.tiers
            .map((_, index) => (
              <option key={index} value={index}>
                {tierName(index, cake.tiers.length)}
              </option>
            ))
            .toReversed()}
        </Select>
        <CoatColourFields
          key={at}
          coating={coating}
          name={`cake.tiers.${at}.coating.colour`}
          legend={`Color of the ${name.toLowerCase()}`}
          ownLabel={`Another color for the ${name.toLowerCase()}`}
          onCoating={(next, undo) => {
            const { cake: whole } = values;
            const same = JSON.stringify(next) === JSON.stringify(whole.coating);
            change({ cake: coatTier(whole, at, same ? null : next) }, undo);
          }}
        />
      </div>
    </Fold>
  );
}
