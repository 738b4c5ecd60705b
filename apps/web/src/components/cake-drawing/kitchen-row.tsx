import type { Cake } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { coatColour } from '#shared/kitchen/coat-colour.ts';
import { plainCoatOf } from '#shared/kitchen/resolve-design.ts';

type Props = {
  readonly cake: Cake;
  readonly menu: Menu;
  /** The middle of the drawing, and where the row begins. */
  readonly middle: number;
  readonly top: number;
  readonly named: boolean;
};

/** Units of the drawing per millimetre: smaller than the cake on show, which is what is looked at. */
const scale = 0.07;
const gap = 22;

/** How much room the row takes; none without cutting cakes. */
export function kitchenRowHeight(cake: Cake | null, named: boolean): number {
  if (cake === null || cake.cuttingCakes.length === 0) return 0;
  return named ? 72 : 40;
}

/** Cutting cakes, small and from above, each kind once with its number: they are never on show. */
export function KitchenRow({ cake, menu, middle, top, named }: Props) {
  const coat = plainCoatOf(cake);
  const fill = coat === null ? 'var(--color-enamel)' : coatColour(menu, coat);
  const kinds = cake.cuttingCakes.flatMap(({ sizeId, count }) => {
    const size = menu.sheetSizes.find((it) => it.id === sizeId);
    return size === undefined
      ? []
      : [{ count, width: size.widthMm * scale, depth: size.depthMm * scale }];
  });
  const step = (it: { width: number }) => 26 + it.width + gap;
  const whole = kinds.reduce((sum, it) => sum + step(it), -gap);
  const deepest = Math.max(0, ...kinds.map((it) => it.depth));
  const row = top + (named ? 24 : 0);
  return (
    <g>
      {named && (
        <text x={middle} y={top + 12} fontSize="13" fill="var(--color-slate)" textAnchor="middle">
          in the kitchen, to cut
        </text>
      )}
      {kinds.map((it, n) => {
        const x =
          middle - whole / 2 + kinds.slice(0, n).reduce((sum, before) => sum + step(before), 0);
        return (
          <g key={n}>
            <text
              x={x + 20}
              y={row + deepest / 2 + 5}
              fontSize="14"
              fontWeight="600"
              fill="var(--color-ink)"
              textAnchor="end"
            >
              {it.count} ×
            </text>
            <rect
              x={x + 26}
              y={row + (deepest - it.depth) / 2}
              width={it.width}
              height={it.depth}
              rx="1.5"
              fill={fill}
              stroke="var(--color-ink)"
              strokeWidth="1.4"
              strokeDasharray={coat === null ? '5 4' : undefined}
            />
          </g>
        );
      })}
    </g>
  );
}
