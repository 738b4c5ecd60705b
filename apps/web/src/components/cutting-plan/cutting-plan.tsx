import type { Cake, Design } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import {
  cuttingPlanOf,
  portionsSentence,
  type PieceCut,
} from '#shared/kitchen/cutting/cutting-plan.ts';
import { blocksOf } from '#shared/kitchen/sizes.ts';
import { supportsOf, type DowelPlace } from '#shared/kitchen/supports.ts';
import { CutDrawing } from './cut-drawing.tsx';

type Props = { readonly design: Design; readonly menu: Menu };

/** How the cake is cut: each piece from above to one scale, with the steps in words. */
export function CuttingPlan({ design, menu }: Props) {
  const { cake } = design;
  const plan = isOnMenu(design, menu) ? cuttingPlanOf(design, menu) : null;
  if (plan === null || cake === null) return <p>The studio no longer bakes this size.</p>;
  const lead = menu.studio.lengthLead;
  const { pieces } = plan;
  const widestMm = Math.max(1, ...pieces.map((it) => it.cut?.block.widthMm ?? 0));
  const dowels = dowelsIn(cake, menu);
  const standing = pieces.some((it) => it.kind === 'tier' && (dowels[it.index] ?? []).length > 0);
  return (
    <div className="grid gap-5">
      <p className="measure">
        {portionsSentence(plan, lead)}
        {cake.kind === 'tiered' &&
          cake.tiers.length > 1 &&
          ' Take the tiers apart first, top down.'}
      </p>
      <ol className="grid gap-6">
        {pieces.map((it) => (
          <li key={`${it.kind} ${it.index}`} className="break-inside-avoid">
            <Piece
              piece={it}
              widestMm={widestMm}
              dowels={it.kind === 'tier' ? (dowels[it.index] ?? []) : []}
            />
          </li>
        ))}
      </ol>
      <ul className="flex flex-wrap gap-x-6 gap-y-1 text-sm text-slate">
        <li className="flex items-center gap-2">
          <svg viewBox="0 0 24 8" className="w-6" aria-hidden="true">
            <path d="M0 4h24" stroke="var(--color-ink)" strokeWidth="1.4" />
          </svg>
          a cut
        </li>
        {standing && (
          <li className="flex items-center gap-2">
            <svg viewBox="0 0 8 8" className="w-2.5" aria-hidden="true">
              <circle cx="4" cy="4" r="3.4" fill="var(--color-berry)" />
            </svg>
            a dowel: take it out before cutting
          </li>
        )}
        <li>All drawn to one scale, from above.</li>
      </ul>
    </div>
  );
}

type PieceProps = {
  readonly piece: PieceCut;
  readonly widestMm: number;
  readonly dowels: readonly DowelPlace[];
};

function Piece({ piece, widestMm, dowels }: PieceProps) {
  const { name, count, left, cut, steps } = piece;
  const portions =
    left === 'dummy'
      ? 'for show only'
      : left === 'keepsake'
        ? 'kept back'
        : `${count === 1 ? '' : `${count} × `}${cut?.portions ?? 0} portions`;
  return (
    <div className="grid items-start gap-x-6 gap-y-3 sm:grid-cols-[minmax(0,13rem)_minmax(0,1fr)]">
      {cut === null ? (
        <span className="hidden sm:block" />
      ) : (
        <CutDrawing
          cut={cut}
          title={`${name}, cut from above: ${portions}`}
          steps={steps}
          dowels={dowels}
          widestMm={widestMm}
        />
      )}
      <div className="grid gap-1">
        <h3>
          {name} <span className="font-sans text-base font-normal text-slate">{portions}</span>
        </h3>
        <ul className="grid gap-1">
          {steps.map((step) => (
            <li key={step} className="measure">
              {step}
            </li>
          ))}
        </ul>
      </div>
    </div>
  );
}

/** Where dowels stand in each tier from the board up; each place once. */
function dowelsIn(cake: Cake, menu: Menu): DowelPlace[][] {
  const blocks = blocksOf(cake, menu);
  const bodies = blocks.map((block, at) => ({ block, real: cake.tiers[at]?.real ?? true }));
  return supportsOf(bodies, menu.kitchen).perTier.map(({ dowels }) =>
    dowels.filter((it) => it.bears === 'tier-above').flatMap((it) => it.at),
  );
}

/** An order may be older than the menu: a sheet or portion size the studio gave up has no plan. */
function isOnMenu({ cake, guests }: Design, menu: Menu): boolean {
  const sizes = new Set(menu.sheetSizes.map((it) => it.id));
  const sheets = [
    ...(cake?.kind === 'sheet' && cake.sheet !== null ? [cake.sheet.sizeId] : []),
    ...(cake?.cuttingCakes ?? []).map((it) => it.sizeId),
  ];
  return (
    menu.portionSizes.some((it) => it.id === guests.portionSizeId) &&
    sheets.every((it) => sizes.has(it))
  );
}
