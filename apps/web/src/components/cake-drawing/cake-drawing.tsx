import { useId } from 'react';
import type { Cake, Look } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { summariseCake } from '#shared/kitchen/summarise-design.ts';
import { classNames } from '#web/lib/class-names.ts';
import { describeCake } from './describe-cake.ts';
import { decorationsPerTier, reachAbove } from './decorated.tsx';
import { type Room, type Shown, type ViewProps, layOutTiers, measureGap } from './layout.ts';
import { KitchenRow, kitchenRowHeight } from './kitchen-row.tsx';
import { SheetView } from './sheet-view.tsx';
import { TieredView } from './tiered-view.tsx';

type Props = {
  /** Null before there is a cake: the bare board. */
  readonly cake: Cake | null;
  readonly look: Look | null;
  readonly menu: Menu;
  /** `full` with names and dimension lines, `small` the cake alone. */
  readonly size?: 'full' | 'small';
  /** How far it has come, 0 to 1: so much of it is filled in from the board up. */
  readonly made?: number;
  /** Cuts off the empty paper above a low cake; without it small drawings line up. */
  readonly trimmed?: boolean;
  readonly className?: string;
};

const views = {
  full: { width: 420, height: 400, room: { x: 84, y: 48, width: 262, height: 300 } },
  small: { width: 240, height: 190, room: { x: 8, y: 34, width: 224, height: 148 } },
} as const;

/** The cake, drawn to scale from the side, with what it is told in words for those who cannot see it. */
export function CakeDrawing({
  cake,
  look,
  menu,
  size = 'full',
  made = 1,
  trimmed = size === 'full',
  className,
}: Props) {
  const id = useId();
  const view = views[size];
  const there =
    cake !== null && (cake.kind === 'sheet' ? cake.sheet !== null : cake.tiers.length > 0);
  const highest = there ? highestPoint(cake, look, menu, view.room) : view.room.y;
  const above = size === 'full' ? measureGap + 28 : 6;
  // Less than none where a tall cake with something standing on it needs more paper above.
  const spare = highest - above;
  const headroom = trimmed ? spare : Math.min(0, spare);
  const kitchen = there ? kitchenRowHeight(cake, size === 'full') : 0;
  const floor = view.room.y + view.room.height;
  const level = highest + (floor - highest) * (1 - made);
  const draw = (show: Shown) =>
    there && (
      <Drawn
        cake={cake}
        look={look}
        menu={menu}
        room={view.room}
        show={show}
        hatch={`${id}-hatch`}
      />
    );
  return (
    <svg
      viewBox={`0 ${headroom} ${view.width} ${view.height - headroom + kitchen}`}
      role="img"
      aria-labelledby={`${id}-title`}
      aria-describedby={`${id}-words`}
      className={classNames(
        'mx-auto block w-full font-sans',
        size === 'full' && 'max-w-xl',
        className,
      )}
    >
      <title id={`${id}-title`}>
        {there ? `${summariseCake(cake, menu)}, drawn to scale` : 'An empty board'}
      </title>
      <desc id={`${id}-words`}>
        {there ? describeCake(cake, look, menu) : 'The cake appears here as you choose it.'}
      </desc>
      <defs>
        <pattern
          id={`${id}-hatch`}
          width="7"
          height="7"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <path d="M0 0v7" stroke="var(--color-slate)" strokeWidth="1.2" />
        </pattern>
        <clipPath id={`${id}-made`}>
          <rect
            x="0"
            width={view.width}
            y={level}
            height={view.height}
            style={{ transition: 'y 200ms var(--ease-world)' }}
          />
        </clipPath>
      </defs>
      {!there && <BareBoard room={view.room} />}
      {made < 1 && <g opacity="0.45">{draw('cake')}</g>}
      <g clipPath={made < 1 ? `url(#${id}-made)` : undefined}>{draw('cake')}</g>
      {size === 'full' && draw('measures')}
      {there && kitchen > 0 && (
        <KitchenRow
          cake={cake}
          menu={menu}
          middle={view.width / 2}
          top={view.height}
          named={size === 'full'}
        />
      )}
    </svg>
  );
}

/** Where the drawing of the cake begins, with what stands on it. */
function highestPoint(cake: Cake, look: Look | null, menu: Menu, room: Room): number {
  if (cake.kind === 'sheet') return room.y;
  const { top, scale } = layOutTiers(cake, menu, room);
  return top - reachAbove(decorationsPerTier(look, menu, cake.tiers.length).at(-1) ?? [], scale);
}

function Drawn(props: ViewProps) {
  return props.cake.kind === 'sheet' ? <SheetView {...props} /> : <TieredView {...props} />;
}

function BareBoard({ room }: { readonly room: Room }) {
  const { x, y, width, height } = room;
  const side = Math.min(width * 0.5, height * 0.5);
  return (
    <g>
      <rect
        x={x + width * 0.12}
        y={y + height - 5}
        width={width * 0.76}
        height="5"
        rx="1.5"
        fill="var(--color-ink)"
      />
      <rect
        x={x + (width - side) / 2}
        y={y + height - 5 - side * 0.7}
        width={side}
        height={side * 0.7}
        rx="3"
        fill="none"
        stroke="var(--color-seam)"
        strokeWidth="1.6"
        strokeDasharray="5 5"
      />
    </g>
  );
}
