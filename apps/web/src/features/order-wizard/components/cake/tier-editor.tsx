import type { Tier } from '#shared/contracts/design.ts';
import { formatLength } from '#shared/kitchen/measures.ts';
import { tierName } from '#shared/kitchen/tier-name.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { Fold } from '#web/components/ui/fold.tsx';
import { useProblemAt } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { PartChoice } from './part-choice.tsx';
import { TierMeasures } from './tier-measures.tsx';

type Props = {
  readonly at: number;
  readonly of: number;
  readonly tier: Tier;
  readonly onChange: (part: Partial<Tier>) => void;
  readonly onMove: (by: 1 | -1) => void;
  readonly onRemove: () => void;
  /** Gives every tier this one's inside; null where they have it already. */
  readonly onSameInside: (() => void) | null;
};

/** One tier: what is inside first, its measures behind a fold, since a proposal has chosen them. */
export function TierEditor({ at, of, tier, onChange, onMove, onRemove, onSameInside }: Props) {
  const { menu, running } = useWizard();
  const path = `cake.tiers.${at}`;
  const spongeProblem = useProblemAt(`${path}.spongeId`);
  const fillingProblem = useProblemAt(`${path}.fillingId`);
  const lead = menu.studio.lengthLead;
  const portions = running.estimate?.portions.perTier[at];
  const across =
    tier.shape === 'rectangle'
      ? `${formatLength(tier.widthMm, lead)} by ${formatLength(tier.depthMm, lead)}`
      : formatLength(tier.widthMm, lead);
  return (
    <li className="grid gap-4 border-t border-seam pt-4">
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <h3>{tierName(at, of)}</h3>
        <p className="text-sm text-slate tabular-nums">
          {across}, {tier.shape}
          {tier.real
            ? portions !== undefined && portions > 0 && `, ${portions} portions`
            : ', for show only'}
          {tier.keepsake && ', kept back'}
        </p>
      </div>
      {tier.real && (
        <div className="grid gap-4 sm:grid-cols-2">
          <PartChoice
            name={`${path}.spongeId`}
            label="Sponge"
            parts={menu.sponges}
            value={tier.spongeId}
            error={spongeProblem}
            onValue={(spongeId) => onChange({ spongeId })}
          />
          <PartChoice
            name={`${path}.fillingId`}
            label="Filling"
            parts={menu.fillings}
            value={tier.fillingId}
            error={fillingProblem}
            onValue={(fillingId) => onChange({ fillingId })}
          />
        </div>
      )}
      <Fold label="Change its shape, size or place">
        <div className="grid gap-5 pb-1">
          <TierMeasures at={at} tier={tier} onChange={onChange} />
          <div className="grid gap-1">
            <Checkbox
              name={`${path}.real`}
              label="Only for show"
              hint="A dummy has no cake inside: it gives height, and stands for hours in any warmth."
              checked={!tier.real}
              onChange={(event) => onChange({ real: !event.target.checked })}
            />
            {tier.real && of > 1 && (
              <Checkbox
                name={`${path}.keepsake`}
                label="Keep this tier back"
                hint="It is not cut on the day, so it feeds nobody then."
                checked={tier.keepsake}
                onChange={(event) => onChange({ keepsake: event.target.checked })}
              />
            )}
          </div>
          <div className="-ml-2 flex flex-wrap gap-x-2">
            {at < of - 1 && (
              <Button kind="quiet" onClick={() => onMove(1)}>
                Move up
              </Button>
            )}
            {at > 0 && (
              <Button kind="quiet" onClick={() => onMove(-1)}>
                Move down
              </Button>
            )}
            <Button kind="quiet" onClick={onRemove}>
              Take it away
            </Button>
          </div>
        </div>
      </Fold>
      {onSameInside !== null && (
        <div>
          <Button kind="quiet" className="-ml-2" onClick={onSameInside}>
            Give every tier this inside
          </Button>
        </div>
      )}
    </li>
  );
}
