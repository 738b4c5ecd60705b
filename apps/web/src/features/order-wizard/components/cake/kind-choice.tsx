import { useState } from 'react';
import type { Proposal } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { cakeOfProposal } from '#shared/kitchen/propose-cakes.ts';
import { portionsOfSheet } from '#shared/kitchen/sizes.ts';
import { summariseCake } from '#shared/kitchen/summarise-design.ts';
import { CakeDrawing } from '#web/components/cake-drawing/cake-drawing.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { RadioGroup, type RadioRow } from '#web/components/ui/radio-group.tsx';
import { addTier, isProposal, nextTier, takeProposal, takeSheet } from '../../design/edit-cake.ts';
import { firstInside } from '../../design/first-inside.ts';
import { useProblemAt } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { KeepTop } from './keep-top.tsx';

const sheetRow = 'sheet';
const ownRow = 'own';

/** The proposed stacks for the head count, a sheet, or one's own. */
export function KindChoice() {
  const { menu, values, change, running } = useWizard();
  const { cake, day } = values;
  const tiersProblem = useProblemAt('cake.tiers');
  const sheetProblem = useProblemAt('cake.sheet');
  const [own, setOwn] = useState(false);
  const proposals = running.estimate?.proposals ?? null;
  const inside = firstInside(menu, day);

  if (proposals === null) {
    return running.failed ? (
      <Failure error={new Error('rules')} onRetry={running.retry} />
    ) : (
      <Pending what="Finding cakes for your table…" />
    );
  }

  const stacks = proposals.filter((it) => it.sheet === null);
  const flat = proposals.find((it) => it.sheet !== null);
  const matching = stacks.find((it) => isProposal(cake, it));
  const chosen = () => {
    if (cake.kind === 'sheet') return sheetRow;
    if (cake.tiers.length === 0) return null;
    return own || matching === undefined ? ownRow : matching.id;
  };

  const choose = (value: string) => {
    setOwn(value === ownRow);
    if (value === sheetRow) {
      const size =
        menu.sheetSizes.find((it) => it.id === (cake.sheet?.sizeId ?? flat?.sheet?.sizeId)) ??
        smallestThatFeeds();
      if (size === undefined) return;
      const { cake: sheet, look } = takeSheet(values, size, inside);
      // Cutting cakes that went with a stack would feed too many beside a sheet.
      const cuttingCakes = size.id === flat?.sheet?.sizeId ? flat.cuttingCakes : [];
      change({ cake: { ...sheet, cuttingCakes }, look });
      return;
    }
    if (value === ownRow) {
      const first = cake.tiers.length > 0 ? null : nextTier(cake, menu, inside);
      change(first === null ? { cake: { ...cake, kind: 'tiered' } } : addTier(values, first));
      return;
    }
    const proposal = stacks.find((it) => it.id === value);
    if (proposal !== undefined) change(takeProposal(values, proposal));
  };

  function smallestThatFeeds() {
    const portion = menu.portionSizes.find((it) => it.id === day.portionSizeId);
    const wanted = running.estimate?.portions.wanted ?? day.headCount;
    return (
      menu.sheetSizes.find((it) => portion && portionsOfSheet(it, portion) >= wanted) ??
      menu.sheetSizes.at(-1)
    );
  }

  const rows: RadioRow<string>[] = stacks.map((it) => proposalRow(it));
  if (menu.sheetSizes.length > 0) {
    rows.push({
      value: sheetRow,
      label: 'A sheet',
      description:
        flat === undefined
          ? 'One flat cake cut in squares: the most cake for the money.'
          : `Flat, cut in squares: the most cake for the money. ${summariseCake(cakeOfProposal(flat, null), menu)}: ${flat.portions} portions`,
      verdict: flat && <Price proposal={flat} menu={menu} />,
    });
  }
  rows.push({
    value: ownRow,
    label: 'Your own',
    description: 'Choose every tier yourself: shape, size, height, what is inside.',
  });

  function proposalRow(proposal: Proposal): RadioRow<string> {
    const drawn = cakeOfProposal(proposal, null);
    return {
      value: proposal.id,
      label: proposal.name,
      description: `${proposal.blurb}: ${proposal.portions} portions`,
      picture: (
        <span aria-hidden="true" className="block w-20">
          <CakeDrawing cake={drawn} look={null} menu={menu} size="small" />
        </span>
      ),
      verdict: <Price proposal={proposal} menu={menu} />,
    };
  }

  return (
    <div className="grid gap-2">
      <RadioGroup
        name="cake.tiers"
        legend={`For ${day.headCount}, we would bake one of these`}
        hint="Prices are for the cake with what is inside it; what goes over and on it comes later."
        large
        error={tiersProblem ?? sheetProblem}
        rows={rows}
        value={chosen()}
        onValue={choose}
      />
      <KeepTop taken={matching ?? null} />
    </div>
  );
}

function Price({ proposal, menu }: { readonly proposal: Proposal; readonly menu: Menu }) {
  return (
    <span className="font-display text-lg tabular-nums">
      {formatMoney(proposal.priceMinor, menu.priceBook.currency, menu.studio.locale)}
    </span>
  );
}
