import type { CuttingCake } from '#shared/contracts/design.ts';
import { countOf } from '#shared/kitchen/sentences.ts';
import { sheetsFor } from '#shared/kitchen/propose-cutting.ts';
import { Button } from '#web/components/ui/button.tsx';
import { addCuttingCakes } from '../../design/edit-cake.ts';
import { firstInside } from '../../design/first-inside.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { CuttingRow } from './cutting-row.tsx';

/** Kinds of cutting cake in one order, as the contract takes them. */
const mostKinds = 6;

/** Plain sheets that stay in the kitchen, for those whom the cake on show does not feed. */
export function CuttingFields() {
  const { menu, values, change, running } = useWizard();
  const { cake, day } = values;
  const { cuttingCakes } = cake;
  const there = cake.kind === 'sheet' ? cake.sheet !== null : cake.tiers.length > 0;
  const portion = menu.portionSizes.find((it) => it.id === day.portionSizeId);
  const [smallest] = menu.sheetSizes.toSorted(
    (a, b) => a.widthMm * a.depthMm - b.widthMm * b.depthMm,
  );
  if (!there || portion === undefined || smallest === undefined) return null;
  const { wanted, fed } = running.estimate?.portions ?? { wanted: 0, fed: 0 };
  const inside = firstInside(menu, day);
  const put = (cakes: CuttingCake[], undo?: string) =>
    change({ cake: { ...cake, cuttingCakes: cakes } }, undo);
  const add = () =>
    change(
      addCuttingCakes(
        values,
        sheetsFor(wanted - fed, menu, portion) ?? { size: smallest, count: 1 },
        inside,
      ),
    );
  const none = cuttingCakes.length === 0;

  return (
    <section className="grid gap-4" aria-labelledby="cutting-heading">
      <div className="grid gap-1">
        <h2 id="cutting-heading">From the kitchen</h2>
        <p className="measure text-slate">
          Cutting cakes: plain sheets that nobody sees, kept cold and sliced for those the cake on
          show does not feed. They wear the same buttercream.
        </p>
      </div>
      {!none && (
        <ul className="grid gap-6">
          {cuttingCakes.map((it, at) => (
            <CuttingRow
              key={at}
              at={at}
              cutting={it}
              portions={running.estimate?.portions.perCuttingCake[at]}
              onChange={(part) =>
                put(cuttingCakes.map((one, i) => (i === at ? { ...one, ...part } : one)))
              }
              onRemove={() =>
                put(
                  cuttingCakes.filter((_, i) => i !== at),
                  `${countOf(it.count, 'cutting cake')} taken away.`,
                )
              }
            />
          ))}
        </ul>
      )}
      {cuttingCakes.length < mostKinds && (
        <div>
          <Button
            kind={none && fed < wanted ? 'secondary' : 'quiet'}
            className={none && fed < wanted ? undefined : '-ml-2'}
            onClick={add}
          >
            {none ? 'Add cutting cakes' : 'Add another kind'}
          </Button>
        </div>
      )}
    </section>
  );
}
