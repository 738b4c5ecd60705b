import { formatLength } from '#shared/kitchen/measures.ts';
import { portionsOfSheet } from '#shared/kitchen/sizes.ts';
import { ChipChoice } from '#web/components/ui/chips.tsx';
import { RadioGroup } from '#web/components/ui/radio-group.tsx';
import type { Sheet } from '#shared/contracts/design.ts';
import { takeSheet } from '../../design/edit-cake.ts';
import { firstInside } from '../../design/first-inside.ts';
import { useProblemAt } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { PartChoice } from './part-choice.tsx';

const layerCounts = ['1', '2', '3'] as const;

/** A sheet: its size, its layers, what is inside. */
export function SheetFields() {
  const { menu, values, change } = useWizard();
  const { cake, day } = values;
  const { sheet } = cake;
  const spongeProblem = useProblemAt('cake.sheet.spongeId');
  const sizeProblem = useProblemAt('cake.sheet');
  const portion = menu.portionSizes.find((it) => it.id === day.portionSizeId);
  const lead = menu.studio.lengthLead;
  const inside = firstInside(menu, day);
  const put = (part: Partial<Sheet>) => {
    if (sheet !== null) change({ cake: { ...cake, sheet: { ...sheet, ...part } } });
  };
  return (
    <section className="grid gap-6">
      <RadioGroup
        name="cake.sheet"
        legend="Size of the sheet"
        error={sizeProblem}
        rows={menu.sheetSizes.map((it) => ({
          value: it.id,
          label: it.name,
          description: `${formatLength(it.widthMm, lead)} by ${formatLength(it.depthMm, lead)}, ${formatLength(it.heightMm, lead)} high`,
          verdict:
            portion === undefined ? undefined : (
              <span className="tabular-nums">{portionsOfSheet(it, portion)} portions</span>
            ),
        }))}
        value={sheet?.sizeId ?? null}
        onValue={(id) => {
          const size = menu.sheetSizes.find((it) => it.id === id);
          if (size !== undefined) change(takeSheet(values, size, inside));
        }}
      />
      {sheet !== null && (
        <>
          <ChipChoice
            name="cake.sheet.layers"
            legend="Layers of sponge"
            chips={layerCounts.map((it) => ({ value: it, label: it }))}
            value={layerCounts.find((it) => Number(it) === sheet.layers) ?? null}
            onValue={(value) => put({ layers: Number(value) })}
          />
          <div className="grid gap-4 sm:grid-cols-2">
            <PartChoice
              name="cake.sheet.spongeId"
              label="Sponge"
              parts={menu.sponges}
              value={sheet.spongeId}
              error={spongeProblem}
              onValue={(spongeId) => put({ spongeId })}
            />
            <PartChoice
              name="cake.sheet.fillingId"
              label="Filling"
              none="None"
              parts={menu.fillings}
              value={sheet.fillingId}
              error={undefined}
              onValue={(fillingId) => put({ fillingId })}
            />
          </div>
        </>
      )}
    </section>
  );
}
