import type { Tier } from '#shared/contracts/design.ts';
import { tierName } from '#shared/kitchen/tier-name.ts';
import { Button } from '#web/components/ui/button.tsx';
import {
  addTier,
  changeTier,
  mostTiers,
  moveTier,
  nextTier,
  removeTier,
} from '../../design/edit-cake.ts';
import { firstInside } from '../../design/first-inside.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { TierEditor } from './tier-editor.tsx';

/** The tiers, drawn order: the top one first. */
export function TierList() {
  const { menu, values, change } = useWizard();
  const { cake, day } = values;
  const { tiers } = cake;
  if (tiers.length === 0) return null;
  const inside = firstInside(menu, day);
  const next = nextTier(cake, menu, inside);

  const changeAt = (at: number, part: Partial<Tier>) =>
    change({
      cake: {
        ...cake,
        tiers: tiers.map((it, i) => (i === at ? changeTier(it, part, inside) : it)),
      },
    });
  const sameInside = (from: Tier) =>
    change(
      {
        cake: {
          ...cake,
          tiers: tiers.map((it) =>
            it.real ? { ...it, spongeId: from.spongeId, fillingId: from.fillingId } : it,
          ),
        },
      },
      'Every tier now has the same inside.',
    );
  const mixed = tiers.some(
    (it) =>
      it.real &&
      tiers.some(
        (other) =>
          other.real && (other.spongeId !== it.spongeId || other.fillingId !== it.fillingId),
      ),
  );

  return (
    <section className="grid gap-5" aria-labelledby="tiers-heading">
      <h2 id="tiers-heading">What is inside</h2>
      <ol className="grid gap-6">
        {tiers
          .map((tier, at) => (
            <TierEditor
              key={at}
              at={at}
              of={tiers.length}
              tier={tier}
              onChange={(part) => changeAt(at, part)}
              onMove={(by) =>
                change(moveTier(values, at, by), `${tierName(at, tiers.length)} moved.`)
              }
              onRemove={() =>
                change(removeTier(values, at), `${tierName(at, tiers.length)} taken away.`)
              }
              onSameInside={mixed && tier.real ? () => sameInside(tier) : null}
            />
          ))
          .toReversed()}
      </ol>
      {tiers.length >= mostTiers || next === null ? (
        <p className="text-slate">Six tiers are the most we stack.</p>
      ) : (
        <div>
          <Button kind="secondary" onClick={() => change(addTier(values, next))}>
            Add a tier on top
          </Button>
        </div>
      )}
    </section>
  );
}
