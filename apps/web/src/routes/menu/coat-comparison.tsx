import type { ReactNode } from 'react';
import type { ButtercreamStyle, Covering, Menu } from '#shared/contracts/menu.ts';
import { byLevel } from '#shared/kitchen/heat.ts';
import { formatTemperature } from '#shared/kitchen/measures.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { CoatSwatch } from '#web/components/coats/coat-swatch.tsx';
import { Dots } from '#web/components/ui/dots.tsx';
import { containsLine, namesAnything } from '#web/features/order-wizard/design/contains.ts';
import { classNames } from '#web/lib/class-names.ts';
import { judgeCoat, type Verdict, type Wish } from './judge-part.ts';
import { VerdictLine } from './verdict-line.tsx';
import { WarmthScale } from './warmth-scale.tsx';

const details = { none: 'soft edges only', soft: 'soft shapes', fine: 'fine shapes' } as const;

type Props = {
  readonly menu: Menu;
  readonly wish: Wish;
};

/** The buttercreams side by side, and which fall away for an allergy or a warm day, and why. */
export function CoatComparison({ menu, wish }: Props) {
  const judged = menu.styles
    .map((style) => ({ style, verdict: judgeCoat(style, wish, menu) }))
    .sort((a, b) => byLevel(a.verdict.level, b.verdict.level));
  const left = judged.filter((it) => it.verdict.level !== 'stop').length;
  const asked = wish.allergen !== null || wish.warmestC !== null;
  return (
    <div className="grid gap-6">
      <p role="status" className="text-slate">
        {asked
          ? `Of the ${menu.styles.length} buttercreams, ${left} can be the outer coat${wish.warmestC === null ? '' : '; under fondant others can'}. The sponge and the filling count too.`
          : 'Each swatch is the color the food has by itself.'}
      </p>
      <ul className="grid gap-x-4 gap-y-8 sm:grid-cols-2 sm:gap-x-6 md:grid-cols-3 xl:grid-cols-6 xl:gap-x-4">
        {judged.map(({ style, verdict }) => (
          <StyleColumn key={style.id} style={style} verdict={verdict} wish={wish} menu={menu} />
        ))}
      </ul>
      <h3>What else goes over a cake</h3>
      <ul className="grid gap-x-8 gap-y-6 md:grid-cols-3">
        {menu.coverings
          .filter((it) => it.id !== 'buttercream')
          .map((covering) => ({ covering, verdict: judgeCoat(covering, wish, menu) }))
          .sort((a, b) => byLevel(a.verdict.level, b.verdict.level))
          .map(({ covering, verdict }) => (
            <CoveringColumn key={covering.id} covering={covering} verdict={verdict} menu={menu} />
          ))}
      </ul>
    </div>
  );
}

/** Greyed where it falls away; the swatch keeps its true colour, on white. */
const columnClasses = (verdict: Verdict) =>
  classNames(
    'min-w-0 content-start rounded-action',
    verdict.level === 'stop' && 'bg-cloud text-slate -m-2 p-2',
  );

type StyleProps = {
  readonly style: ButtercreamStyle;
  readonly verdict: Verdict;
  readonly wish: Wish;
  readonly menu: Menu;
};

/** Rows of neighbouring columns lie level, so that they compare: one grid row for each fact. */
function StyleColumn({ style, verdict, wish, menu }: StyleProps) {
  const { labelRegion } = menu.studio;
  const contents = capitalise(containsLine(style.contents, labelRegion));
  const facts: readonly (readonly [string, ReactNode])[] = [
    ['Sweetness', <Dots key="sweet" label="Sweetness" value={style.sweetness} bare />],
    ['How smooth', <Dots key="smooth" label="Smoothness" value={style.smoothness} bare />],
    ['How detailed', capitalise(details[style.detail]) + (style.crusts ? ', sets a crust' : '')],
    [
      'How warm',
      <WarmthScale
        key="warm"
        limitC={style.holdsToC}
        warmestC={Number.isNaN(wish.warmestC) ? null : wish.warmestC}
        menu={menu}
      />,
    ],
    [
      'What is in it',
      <span key="in" className="grid gap-1">
        <strong>{contents}.</strong>
        {style.contents.statement !== '' && <span>{style.contents.statement}.</span>}
      </span>,
    ],
    ['Best for', style.bestFor],
    ['How it is made', style.how],
  ];
  return (
    <li
      className={classNames(
        'grid gap-y-3 sm:row-span-9 sm:grid-rows-subgrid',
        columnClasses(verdict),
      )}
    >
      <div className="rounded-mark bg-enamel">
        <CoatSwatch
          menu={menu}
          covering="buttercream"
          style={style.id}
          className="w-full max-w-48 sm:max-w-none [&_path]:[vector-effect:non-scaling-stroke]"
        />
      </div>
      <div className="grid content-start gap-1">
        <h3>{style.name}</h3>
        <VerdictLine verdict={verdict} />
        <p className="text-sm">{style.blurb}</p>
      </div>
      <dl className="contents">
        {facts.map(([name, value]) => (
          <div
            key={name}
            className="grid grid-cols-[7rem_1fr] content-start gap-x-4 border-t border-seam pt-2 text-sm sm:grid-cols-1"
          >
            <dt className="text-slate">{name}</dt>
            <dd className="min-w-0">{value}</dd>
          </div>
        ))}
      </dl>
    </li>
  );
}

function CoveringColumn({
  covering,
  verdict,
  menu,
}: {
  readonly covering: Covering;
  readonly verdict: Verdict;
  readonly menu: Menu;
}) {
  const { labelRegion, temperatureLead } = menu.studio;
  const over = covering.id === 'ganache' ? null : (menu.styles[1]?.id ?? null);
  return (
    <li className={classNames('grid gap-1', columnClasses(verdict))}>
      <div className="justify-self-start rounded-mark bg-enamel">
        <CoatSwatch menu={menu} covering={covering.id} style={over} className="w-28" />
      </div>
      <h4 className="text-lg">{covering.name}</h4>
      <VerdictLine verdict={verdict} />
      <p>{covering.blurb}</p>
      <p className="text-sm text-slate">
        {covering.id === 'ganache' ? '' : 'Lies over a buttercream, which adds its own contents. '}
        {namesAnything(covering.contents) || covering.id === 'ganache'
          ? `${capitalise(containsLine(covering.contents, labelRegion))}. `
          : ''}
        Holds to {formatTemperature(covering.holdsToC, temperatureLead)}.
      </p>
    </li>
  );
}
