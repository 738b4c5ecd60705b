import type { Cake } from '#shared/contracts/design.ts';
import type { Estimate } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { formatLength, formatWeight } from '#shared/kitchen/measures.ts';
import { pieceName } from '#shared/kitchen/piece-name.ts';

type Props = {
  readonly estimate: Pick<Estimate, 'weightG' | 'heightMm' | 'pieces'>;
  readonly cake: Cake;
  readonly menu: Menu;
};

/** More than one person should lift alone (trade memory, no source). */
const twoPeopleG = 12_000;

/** What somebody lifts: the cake on its board, and each cutting cake. Nothing before it is known. */
export function CarriedWeight({ estimate, cake, menu }: Props) {
  const { weightG, heightMm, pieces } = estimate;
  if (weightG === 0) return null;
  const lead = menu.studio.lengthLead;
  const cutting = pieces.filter((it) => it.kind === 'cutting-cake');
  return (
    <div className="grid gap-1">
      <p className="measure">
        It weighs about <strong className="tabular-nums">{formatWeight(weightG, lead)}</strong> on
        its board and stands {formatLength(heightMm, lead)} high.
        {weightG > twoPeopleG && ' Come with somebody to carry it with you.'}
      </p>
      {cutting.map((it) => (
        <p key={it.index} className="measure">
          {pieceName(it, cake, menu)}: {it.count === 1 ? '' : `${it.count} of them, each `}about{' '}
          <strong className="tabular-nums">{formatWeight(it.weightG, lead)}</strong>.
        </p>
      ))}
    </div>
  );
}
