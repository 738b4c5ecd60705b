import type { CuttingCake } from '#shared/contracts/design.ts';
import { Button } from '#web/components/ui/button.tsx';
import { NumberField } from '#web/components/ui/number-field.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { useProblemAt } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { PartChoice } from './part-choice.tsx';

type Props = {
  readonly at: number;
  readonly cutting: CuttingCake;
  /** All of this kind together; undefined until it is estimated. */
  readonly portions: number | undefined;
  readonly onChange: (part: Partial<CuttingCake>) => void;
  readonly onRemove: () => void;
};

/** Cutting cakes of one kind: how many, which sheet, what is inside. */
export function CuttingRow({ at, cutting, portions, onChange, onRemove }: Props) {
  const { menu } = useWizard();
  const path = `cake.cuttingCakes.${at}`;
  const countProblem = useProblemAt(`${path}.count`);
  const spongeProblem = useProblemAt(`${path}.spongeId`);
  const size = menu.sheetSizes.find((it) => it.id === cutting.sizeId);
  return (
    <li className="grid gap-4 border-t border-seam pt-4">
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <h3>{size?.name ?? 'Cutting cake'}</h3>
        {portions !== undefined && (
          <p className="text-sm text-slate tabular-nums">{portions} portions</p>
        )}
      </div>
      <div className="grid gap-4 sm:grid-cols-3">
        <NumberField
          name={`${path}.count`}
          label="How many"
          error={countProblem}
          value={cutting.count}
          onValue={(count) => onChange({ count: count ?? Number.NaN })}
        />
        <Select
          name={`${path}.sizeId`}
          label="Size"
          value={cutting.sizeId}
          onChange={(event) => onChange({ sizeId: event.target.value })}
        >
          {menu.sheetSizes.map((it) => (
            <option key={it.id} value={it.id}>
              {it.name}
            </option>
          ))}
        </Select>
        <Select
          name={`${path}.layers`}
          label="Layers of sponge"
          value={cutting.layers}
          onChange={(event) => onChange({ layers: Number(event.target.value) })}
        >
          {[1, 2, 3].map((it) => (
            <option key={it} value={it}>
              {it}
            </option>
          ))}
        </Select>
      </div>
      <div className="grid gap-4 sm:grid-cols-2">
        <PartChoice
          name={`${path}.spongeId`}
          label="Sponge"
          parts={menu.sponges}
          value={cutting.spongeId}
          error={spongeProblem}
          onValue={(spongeId) => onChange({ spongeId })}
        />
        <PartChoice
          name={`${path}.fillingId`}
          label="Filling"
          none="None"
          parts={menu.fillings}
          value={cutting.fillingId}
          error={undefined}
          onValue={(fillingId) => onChange({ fillingId })}
        />
      </div>
      <div>
        <Button kind="quiet" className="-ml-2" onClick={onRemove}>
          Take these away
        </Button>
      </div>
    </li>
  );
}
