import type { Tier } from '#shared/contracts/design.ts';
import type { TierSize } from '#shared/contracts/menu.ts';
import type { Shape } from '#shared/contracts/vocabulary.ts';
import { formatLength } from '#shared/kitchen/measures.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { ChipChoice } from '#web/components/ui/chips.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { useProblemAt } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';

const layerCounts = [2, 3, 4, 5] as const;

type Props = {
  readonly at: number;
  readonly tier: Tier;
  readonly onChange: (part: Partial<Tier>) => void;
};

/** Shape, size, height and layers of a tier, out of what the studio bakes. */
export function TierMeasures({ at, tier, onChange }: Props) {
  const { menu } = useWizard();
  const path = `cake.tiers.${at}`;
  const widthProblem = useProblemAt(`${path}.widthMm`);
  const heightProblem = useProblemAt(`${path}.heightMm`);
  const lead = menu.studio.lengthLead;
  const shapes = [...new Set(menu.tierSizes.map((it) => it.shape))];
  const sizes = menu.tierSizes.filter((it) => it.shape === tier.shape);
  const key = (it: Pick<TierSize, 'widthMm' | 'depthMm'>) => `${it.widthMm}x${it.depthMm}`;
  const size = sizes.find((it) => key(it) === key(tier));
  const heights = [...new Set([...(size?.heightsMm ?? []), tier.heightMm])].toSorted(
    (a, b) => a - b,
  );

  /** Takes a size of the studio's, with the height it has nearest to the present one. */
  const take = (next: TierSize | undefined) => {
    if (next === undefined) return;
    const [nearest] = next.heightsMm.toSorted(
      (a, b) => Math.abs(a - tier.heightMm) - Math.abs(b - tier.heightMm),
    );
    onChange({
      shape: next.shape,
      widthMm: next.widthMm,
      depthMm: next.depthMm,
      heightMm: nearest ?? tier.heightMm,
    });
  };
  const takeShape = (shape: Shape) => {
    const [nearest] = menu.tierSizes
      .filter((it) => it.shape === shape)
      .toSorted((a, b) => Math.abs(a.widthMm - tier.widthMm) - Math.abs(b.widthMm - tier.widthMm));
    take(nearest);
  };

  return (
    <div className="grid gap-4">
      <ChipChoice
        name={`${path}.shape`}
        legend="Shape"
        chips={shapes.map((it) => ({ value: it, label: capitalise(it) }))}
        value={tier.shape}
        onValue={takeShape}
      />
      <div className="grid gap-4 sm:grid-cols-3">
        <Select
          name={`${path}.widthMm`}
          label={tier.shape === 'round' ? 'Across' : 'Sides'}
          error={widthProblem}
          value={key(tier)}
          onChange={(event) => take(sizes.find((it) => key(it) === event.target.value))}
        >
          {size === undefined && (
            <option value={key(tier)}>{formatLength(tier.widthMm, lead)}</option>
          )}
          {sizes.map((it) => (
            <option key={key(it)} value={key(it)}>
              {it.shape === 'rectangle'
                ? `${formatLength(it.widthMm, lead)} by ${formatLength(it.depthMm, lead)}`
                : formatLength(it.widthMm, lead)}
            </option>
          ))}
        </Select>
        <Select
          name={`${path}.heightMm`}
          label="High"
          error={heightProblem}
          value={tier.heightMm}
          onChange={(event) => onChange({ heightMm: Number(event.target.value) })}
        >
          {heights.map((it) => (
            <option key={it} value={it}>
              {formatLength(it, lead)}
            </option>
          ))}
        </Select>
        <Select
          name={`${path}.layers`}
          label="Layers of sponge"
          value={tier.layers}
          onChange={(event) => onChange({ layers: Number(event.target.value) })}
        >
          {layerCounts.map((it) => (
            <option key={it} value={it}>
              {it}
            </option>
          ))}
        </Select>
      </div>
    </div>
  );
}
