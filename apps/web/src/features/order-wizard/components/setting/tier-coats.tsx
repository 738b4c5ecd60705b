import type { Coating } from '#shared/contracts/design.ts';
import type { CoatRank } from '#shared/contracts/estimates.ts';
import { coatingName } from '#shared/kitchen/resolve-design.ts';
import { tierName } from '#shared/kitchen/tier-name.ts';
import { Fold } from '#web/components/ui/fold.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { coatOf, coatTier, pickFromKey, pickKey } from '../../design/choose-coat.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { finishWords } from './finish-words.ts';

const levelWords = { ok: '', care: ' (with care)', stop: ' (not for your day)' } as const;

/** Another coat on one tier, behind a fold: most cakes wear one. */
export function TierCoats() {
  const { menu, values, change, running } = useWizard();
  const { cake } = values;
  const ranks = running.estimate?.ranks ?? [];
  if (cake.kind === 'sheet' || cake.tiers.length < 2 || cake.coating === null) return null;
  const any = cake.tiers.some((it) => it.coating !== null);

  const nameOf = (rank: CoatRank) => {
    const covering = menu.coverings.find((it) => it.id === rank.covering);
    const style = menu.styles.find((it) => it.id === rank.style) ?? null;
    return covering === undefined ? '' : coatingName({ covering, style });
  };
  const put = (at: number, coating: Coating | null) =>
    change({ cake: coatTier(cake, at, coating) });

  return (
    <Fold label="Another coat on one tier" open={any}>
      <ol className="grid gap-4">
        {cake.tiers
          .map((tier, at) => {
            const finishes =
              menu.coverings.find((it) => it.id === tier.coating?.covering)?.finishes ?? [];
            return (
              <li key={at} className="grid gap-4 sm:grid-cols-2">
                <Select
                  name={`cake.tiers.${at}.coating`}
                  label={tierName(at, cake.tiers.length)}
                  value={tier.coating === null ? '' : pickKey(tier.coating)}
                  onChange={(event) => {
                    const pick = pickFromKey(event.target.value, ranks);
                    put(
                      at,
                      pick === null ? null : coatOf(pick, tier.coating ?? cake.coating, menu),
                    );
                  }}
                >
                  <option value="">Like the rest</option>
                  {ranks.map((it) => (
                    <option key={pickKey(it)} value={pickKey(it)}>
                      {nameOf(it)}
                      {levelWords[it.level]}
                    </option>
                  ))}
                </Select>
                {tier.coating !== null && (
                  <Select
                    name={`cake.tiers.${at}.coating.finish`}
                    label="Its finish"
                    value={tier.coating.finish}
                    onChange={(event) => {
                      const finish = finishes.find((it) => it === event.target.value);
                      if (finish !== undefined && tier.coating !== null) {
                        put(at, { ...tier.coating, finish });
                      }
                    }}
                  >
                    {finishes.map((it) => (
                      <option key={it} value={it}>
                        {finishWords[it]}
                      </option>
                    ))}
                  </Select>
                )}
              </li>
            );
          })
          .toReversed()}
      </ol>
    </Fold>
  );
}
