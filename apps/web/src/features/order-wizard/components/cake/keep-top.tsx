import type { Proposal } from '#shared/contracts/estimates.ts';
import { portionsWanted } from '#shared/kitchen/portions.ts';
import { proposeStacks, tiersOf } from '#shared/kitchen/proposals.ts';
import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { takeProposal } from '../../design/edit-cake.ts';
import { firstInside } from '../../design/first-inside.ts';
import { useWizard } from '../../wizard/wizard-context.ts';

/** Whether the top tier is kept back for later; the proposal taken is then one whose others feed all. */
export function KeepTop({ taken }: { readonly taken: Proposal | null }) {
  const { menu, values, change } = useWizard();
  const { cake, day } = values;
  const top = cake.tiers.at(-1);
  if (cake.kind !== 'tiered' || cake.tiers.length < 2 || top?.real !== true) return null;

  const keep = (keepTop: boolean) => {
    const portion = menu.portionSizes.find((it) => it.id === day.portionSizeId);
    if (taken !== null && taken.cuttingCakes.length === 0 && portion !== undefined) {
      const shape = cake.tiers[0]?.shape === 'square' ? 'square' : 'round';
      const stacks = proposeStacks(portionsWanted(day, menu), menu, portion, { keepTop, shape });
      const stack = stacks.find((it) => it.blurb === taken.blurb) ?? stacks[0];
      if (stack !== undefined) {
        const tiers = tiersOf(stack, firstInside(menu, day), menu.kitchen);
        change(takeProposal(values, { tiers, cuttingCakes: [] }));
        return;
      }
    }
    const tiers = cake.tiers.map((it) => (it === top ? { ...it, keepsake: keepTop } : it));
    change({ cake: { ...cake, tiers } });
  };

  return (
    <Checkbox
      name="cake.keepTop"
      label="Keep the top tier back for later"
      hint="It is not cut on the day; the tiers below it feed everybody."
      checked={top.keepsake}
      onChange={(event) => keep(event.target.checked)}
    />
  );
}
