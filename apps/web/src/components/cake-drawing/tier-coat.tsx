import type { Coating, Tier } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import type { CoveringId } from '#shared/contracts/vocabulary.ts';
import { coatColour } from '#shared/kitchen/coat-colour.ts';
import { pipedEdge } from '#web/components/coats/piped-edge.ts';
import { deeper, lineOn } from '#web/components/coats/shades.ts';
import type { Box } from './layout.ts';

/** How round the upper edge is, in units of the drawing: sugar paste folds, ganache stands sharp. */
const corners: Record<CoveringId, number> = {
  buttercream: 3,
  fondant: 9,
  ganache: 0.5,
  'semi-naked': 2,
};

type Props = {
  readonly box: Box;
  readonly tier: Pick<Tier, 'layers' | 'real' | 'spongeId' | 'fillingId'>;
  readonly coat: Coating | null;
  readonly menu: Menu;
  /** Id of the hatching, for dummies. */
  readonly hatch: string;
};

/** One tier as it stands: its coat with the coat's own edge, its layers shining through. */
export function TierCoat({ box, tier, coat, menu, hatch }: Props) {
  const fill = coat === null ? 'var(--color-enamel)' : coatColour(menu, coat);
  const naked = coat?.covering === 'semi-naked';
  const sponge = menu.sponges.find((it) => it.id === tier.spongeId)?.colour;
  const ground = naked && tier.real && sponge !== undefined ? sponge : fill;
  return (
    <g>
      <path d={outline(box, coat)} fill={ground} />
      {naked && tier.real && <Scraped box={box} fill={fill} />}
      {tier.real && (
        <Layers box={box} tier={tier} menu={menu} fill={naked ? ground : fill} strong={naked} />
      )}
      {coat?.finish === 'textured' && <Combed box={box} fill={fill} />}
      {!tier.real && <path d={outline(box, coat)} fill={`url(#${hatch})`} />}
      <path
        d={outline(box, coat)}
        fill="none"
        stroke="var(--color-ink)"
        strokeWidth="1.6"
        strokeLinejoin="round"
        strokeDasharray={coat === null ? '5 4' : undefined}
      />
      {coat?.finish === 'piped' && coat.style !== null && (
        <FootBorder box={box} coat={coat} fill={fill} />
      )}
    </g>
  );
}

/** How high the piped edge of a tier stands. */
function beadHeight(box: Box): number {
  return Math.min(10, Math.max(5, box.width * 0.05));
}

function outline({ x, y, width, height }: Box, coat: Coating | null): string {
  if (coat?.finish === 'piped' && coat.style !== null) {
    return `M${x} ${y + height}V${y} ${pipedEdge(coat.style, width, beadHeight({ x, y, width, height }))} V${y + height}z`;
  }
  const r = corners[coat?.covering ?? 'buttercream'];
  return `M${x} ${y + height}V${y + r}q0 ${-r} ${r} ${-r}h${width - 2 * r}q${r} 0 ${r} ${r}V${y + height}z`;
}

function Layers({
  box,
  tier,
  menu,
  fill,
  strong,
}: {
  readonly box: Box;
  readonly tier: Props['tier'];
  readonly menu: Menu;
  readonly fill: string;
  readonly strong: boolean;
}) {
  const filling = menu.fillings.find((it) => it.id === tier.fillingId)?.colour;
  const colour = strong && filling !== undefined ? filling : lineOn(filling ?? fill);
  return (
    <g strokeWidth={strong ? 3 : 1.4} strokeOpacity={strong ? 1 : 0.5} style={{ stroke: colour }}>
      {Array.from({ length: Math.max(0, tier.layers - 1) }, (_, at) => (
        <path
          key={at}
          d={`M${box.x + 1} ${box.y + (box.height * (at + 1)) / tier.layers}h${box.width - 2}`}
        />
      ))}
    </g>
  );
}

/** A comb drawn round the side: shallow waves, one under the other. */
function Combed({ box, fill }: { readonly box: Box; readonly fill: string }) {
  const rows = Math.max(2, Math.floor(box.height / 8));
  const wave = box.width / Math.max(2, Math.round(box.width / 36)) / 2;
  const waves = Math.round(box.width / wave);
  return (
    <g fill="none" strokeWidth="1" style={{ stroke: lineOn(fill) }}>
      {Array.from({ length: rows }, (_, at) => (
        <path
          key={at}
          d={`M${box.x + 1} ${box.y + ((at + 0.6) * box.height) / rows}q${(wave - 0.5) / 2} -3 ${wave - 0.5} 0${` t${wave} 0`.repeat(Math.max(0, waves - 2))} t${wave - 1} 0`}
        />
      ))}
    </g>
  );
}

/** The thin scraped coat of a semi-naked cake: patches of it left upon the sponge. */
function Scraped({ box, fill }: { readonly box: Box; readonly fill: string }) {
  const { x, y, width, height } = box;
  const patches = [
    [0.004, -0.02, 0.99, 0.22],
    [0.02, 0.25, 0.4, 0.18],
    [0.48, 0.3, 0.5, 0.14],
    [0.12, 0.53, 0.6, 0.18],
    [0.01, 0.78, 0.46, 0.2],
    [0.52, 0.76, 0.47, 0.22],
  ] as const;
  return (
    <g fillOpacity="0.86" fill={fill}>
      {patches.map(([left, top, wide, high]) => (
        <path
          key={`${left} ${top}`}
          d={smear(x + left * width, y + top * height, wide * width, high * height)}
        />
      ))}
    </g>
  );
}

/** One stroke of the scraper: it starts thin, spreads and trails off. */
function smear(x: number, y: number, w: number, h: number): string {
  return `M${x} ${y + h * 0.55}q${w * 0.22} ${-h * 0.75} ${w * 0.5} ${-h * 0.45}t${w * 0.5} ${h * 0.2}q${-w * 0.16} ${h * 0.6} ${-w * 0.44} ${h * 0.42}t${-w * 0.56} ${-h * 0.17}z`;
}

function FootBorder({
  box,
  coat,
  fill,
}: {
  readonly box: Box;
  readonly coat: Coating;
  readonly fill: string;
}) {
  if (coat.style === null) return null;
  const high = beadHeight(box) * 0.8;
  return (
    <path
      d={`M${box.x - 2} ${box.y + box.height} ${pipedEdge(coat.style, box.width + 4, high)} z`}
      stroke="var(--color-ink)"
      strokeWidth="1.2"
      strokeLinejoin="round"
      style={{ fill: deeper(fill) }}
    />
  );
}
