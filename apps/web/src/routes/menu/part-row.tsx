import type { ReactNode } from 'react';
import type { Contents } from '#shared/contracts/menu.ts';
import type { LabelRegion } from '#shared/contracts/vocabulary.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { containsLine } from '#web/features/order-wizard/design/contains.ts';
import { classNames } from '#web/lib/class-names.ts';
import type { Verdict } from './judge-part.ts';
import { VerdictLine } from './verdict-line.tsx';

type Props = {
  readonly name: string;
  readonly blurb: string;
  readonly picture: ReactNode;
  /** The price, or what it adds. */
  readonly price?: string;
  readonly caution?: string;
  readonly contents?: Contents;
  readonly region: LabelRegion;
  /** Whether it suits the table that was described. */
  readonly verdict?: Verdict;
};

/** One thing of the menu: its picture, what it is, what it contains, what it costs. */
export function PartRow({
  name,
  blurb,
  picture,
  price,
  caution = '',
  contents,
  region,
  verdict,
}: Props) {
  return (
    <li
      className={classNames(
        'flex gap-4 border-b border-seam py-4',
        verdict?.level === 'stop' && 'bg-cloud px-3 text-slate',
      )}
    >
      {picture}
      <div className="grid min-w-0 flex-1 content-start gap-1">
        <p className="flex flex-wrap items-baseline justify-between gap-x-4">
          <strong className="font-display text-lg leading-snug">{name}</strong>
          {price !== undefined && <span className="text-sm text-slate tabular-nums">{price}</span>}
        </p>
        <p>{blurb}</p>
        {contents && (
          <p className="text-sm text-slate">{capitalise(containsLine(contents, region))}.</p>
        )}
        {verdict && <VerdictLine verdict={verdict} />}
        {caution !== '' && <p className="text-sm font-semibold">{caution}</p>}
      </div>
    </li>
  );
}

/** A spoonful in the food's own colour, on white. */
export function ColourSpoon({ colour }: { readonly colour: string }) {
  return (
    <span
      aria-hidden="true"
      className="mt-1 size-9 shrink-0 rounded-round border-[1.5px] border-ink"
      style={{ backgroundColor: colour }}
    />
  );
}
