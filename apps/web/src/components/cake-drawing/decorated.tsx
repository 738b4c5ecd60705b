import type { Coating, Look } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { coatColour } from '#shared/kitchen/coat-colour.ts';
import { pipedEdge } from '#web/components/coats/piped-edge.ts';
import { deeper, outlineOf } from '#web/components/coats/shades.ts';
import {
  Figure,
  Flower,
  Fruit,
  type GlyphKind,
  Leaf,
  Print,
  Topper,
  glyphColours,
} from './decoration-glyph.tsx';
import type { Box, TierBox } from './layout.ts';

export type Placed = {
  readonly key: string;
  readonly glyph: GlyphKind;
  readonly colour: string;
  readonly quantity: number;
};

/** What goes on each tier, from the board up; what goes on the whole cake is shared out. */
export function decorationsPerTier(
  look: Look | null,
  menu: Menu,
  tierCount: number,
): readonly (readonly Placed[])[] {
  const perTier: Placed[][] = Array.from({ length: tierCount }, () => []);
  for (const [at, placed] of (look?.decorations ?? []).entries()) {
    const known = menu.decorations.find((it) => it.id === placed.decorationId);
    if (known === undefined) continue;
    const { glyph } = known;
    const entry = {
      key: `${at}`,
      glyph,
      colour: placed.colour ?? defaultColour(glyph, menu),
      // Priced for a tier or the whole, it is as many as go round.
      quantity: known.per === 'piece' ? placed.quantity : mostOfAKind,
    };
    const tiers = placed.tier === null ? tiersOfWhole(glyph, tierCount) : [placed.tier];
    for (const tier of tiers) perTier[tier]?.push(entry);
  }
  return perTier;
}

function defaultColour(glyph: GlyphKind, menu: Menu): string {
  const ganache = menu.coverings.find((it) => it.id === 'ganache')?.colour;
  return glyph === 'drip' && ganache !== undefined ? ganache : glyphColours[glyph];
}

/** Bands go round every tier, figures stand on the top one, clusters sit on every ledge. */
function tiersOfWhole(glyph: GlyphKind, tierCount: number): number[] {
  const all = Array.from({ length: tierCount }, (_, at) => at);
  switch (glyph) {
    case 'figure':
    case 'topper':
    case 'drip':
      return all.slice(-1);
    case 'print':
      return all.slice(0, 1);
    default:
      return all;
  }
}

type BandProps = {
  readonly box: Box;
  readonly placed: readonly Placed[];
  readonly coat: Coating | null;
  readonly menu: Menu;
};

/** What goes round a tier or lies on its side. Drawn over the coat, under the tier above. */
export function Bands({ box, placed, coat, menu }: BandProps) {
  const foot = box.y + box.height;
  return placed.map(({ key, glyph, colour }) => {
    switch (glyph) {
      case 'pearl': {
        const count = Math.max(3, Math.round(box.width / 8));
        return (
          <g key={key} fill={colour} strokeWidth="0.9" style={{ stroke: outlineOf(colour) }}>
            {Array.from({ length: count }, (_, at) => (
              <circle
                key={at}
                cx={box.x + ((at + 0.5) * box.width) / count}
                cy={foot - 3}
                r="2.9"
              />
            ))}
          </g>
        );
      }
      case 'border': {
        const own =
          coat === null || colour !== glyphColours.border ? colour : coatColour(menu, coat);
        return (
          <path
            key={key}
            d={`M${box.x - 2} ${foot} ${pipedEdge(coat?.style ?? 'french', box.width + 4, 7)} z`}
            stroke="var(--color-ink)"
            strokeWidth="1.1"
            strokeLinejoin="round"
            style={{ fill: deeper(own) }}
          />
        );
      }
      case 'ribbon': {
        const high = Math.min(11, box.height * 0.16);
        const knot = box.x + box.width * 0.3;
        return (
          <g key={key} fill={colour} strokeWidth="0.9" style={{ stroke: outlineOf(colour) }}>
            <rect x={box.x} y={foot - high - 3} width={box.width} height={high} />
            <g transform={`translate(${knot} ${foot - high / 2 - 3}) scale(${high / 11})`}>
              <path d="M0 0c-4-10-15-9-12-1s8 4 12 1c4-10 15-9 12-1s-8 4-12 1zM0 0l-7 12 5-2zM0 0l7 12-5-2z" />
            </g>
          </g>
        );
      }
      case 'drip':
        return (
          <path
            key={key}
            d={dripOver(box)}
            fill={colour}
            strokeWidth="1.2"
            strokeLinejoin="round"
            style={{ stroke: outlineOf(colour) }}
          />
        );
      case 'sprinkle':
        return <Sprinkles key={key} box={box} colour={colour} />;
      default:
        return null;
    }
  });
}

const dripLengths = [0.34, 0.16, 0.5, 0.22, 0.4, 0.14, 0.28] as const;

function dripOver({ x, y, width, height }: Box): string {
  const count = Math.max(3, Math.round(width / 13));
  const step = width / count;
  const drips = Array.from({ length: count }, (_, at) => {
    const long = height * (dripLengths[at % dripLengths.length] ?? 0.2);
    const thick = step * 0.62;
    // From the right edge back to the left: a hollow, then down and up one drip.
    return `q${-(step - thick) / 2} ${-step * 0.3} ${-(step - thick)} 0v${long}q0 ${thick / 2} ${-thick / 2} ${thick / 2}t${-thick / 2} ${-thick / 2}v${-long}`;
  });
  return `M${x} ${y - 0.5}h${width}v6 ${drips.join(' ')} z`;
}

const sprinkleColours = [
  'var(--color-butter)',
  'var(--color-cobalt)',
  'var(--color-leaf)',
] as const;

function Sprinkles({ box, colour }: { readonly box: Box; readonly colour: string }) {
  const count = Math.max(8, Math.round(box.width / 6));
  return (
    <g strokeWidth="1.7" strokeLinecap="round">
      {Array.from({ length: count }, (_, at) => {
        // Steps by the plastic number scatter evenly over a plane, and always the same way.
        const across = (at * 0.754878) % 1;
        const up = ((at * 0.56984) % 1) ** 1.6;
        const turn = (at * at * 47) % 180;
        const tint =
          at % 2 === 0 ? colour : (sprinkleColours[(at >> 1) % sprinkleColours.length] ?? colour);
        return (
          <path
            key={at}
            d="M-1.8 0h3.6"
            stroke={tint}
            transform={`translate(${box.x + 5 + across * (box.width - 10)} ${box.y + box.height - 5 - up * box.height * 0.4}) rotate(${turn})`}
          />
        );
      })}
    </g>
  );
}

/** Where the parts of a cluster lie about its middle, nearest first, in parts of its size. */
const spots = [
  [0, -0.25],
  [-0.8, 0.05],
  [0.78, 0.1],
  [-0.38, -0.95],
  [0.5, -0.85],
  [1.5, 0.25],
  [-1.5, 0.25],
  [1.2, -0.5],
  [-1.15, -0.6],
] as const;

const mostOfAKind = 4;

const clusterSize = (scale: number) => Math.min(15, Math.max(8, 26 * scale));
const figureSize = (scale: number) => Math.min(34, Math.max(16, 60 * scale));
const topperSize = (scale: number) => Math.min(44, Math.max(22, 90 * scale));

/** How far what stands on the top tier reaches above it, in units of the drawing. */
export function reachAbove(placed: readonly Placed[], scale: number): number {
  return Math.max(
    0,
    ...placed.map(({ glyph }) => {
      switch (glyph) {
        case 'topper':
          return topperSize(scale) * 1.05;
        case 'figure':
          return figureSize(scale) * 1.05;
        case 'flower':
        case 'fruit':
        case 'leaf':
          return clusterSize(scale) * 1.7;
        default:
          return 0;
      }
    }),
  );
}

type StandingProps = {
  readonly at: TierBox;
  /** The tier above, if there is one. */
  readonly above: TierBox | undefined;
  readonly placed: readonly Placed[];
  readonly index: number;
  readonly scale: number;
};

/** What sits on a tier's top: clusters on its ledge, figures, toppers; pictures on its face. */
export function Standing({ at, above, placed, index, scale }: StandingProps) {
  const right = index % 2 === 0;
  const size = clusterSize(scale);
  const ledge =
    above === undefined ? at.x + at.width * 0.66 : right ? above.x + above.width - 2 : above.x + 2;
  const cluster = placed.flatMap((it) =>
    it.glyph === 'flower' || it.glyph === 'leaf' || it.glyph === 'fruit'
      ? Array.from({ length: Math.min(mostOfAKind, it.quantity) }, (_, n) => ({ ...it, n }))
      : [],
  );
  // Leaves lie behind and outside, flowers in front and in the middle.
  const ordered = [...cluster].sort(
    (a, b) => Number(a.glyph === 'leaf') - Number(b.glyph === 'leaf'),
  );
  const drawn = ordered
    .slice(0, spots.length)
    .map((it, n) => ({ ...it, spot: spots[n] ?? spots[0] }));
  const others = placed.filter(
    (it) => it.glyph === 'figure' || it.glyph === 'topper' || it.glyph === 'print',
  );
  return (
    <g>
      {others.map((it, n) => (
        <Other key={it.key} it={it} n={n} at={at} above={above} right={right} scale={scale} />
      ))}
      {[...drawn].reverse().map(({ key, n, glyph, colour, spot }) => (
        <g
          key={`${key}-${n}`}
          transform={`translate(${ledge + spot[0] * size * (right ? 1 : -1)} ${at.y + spot[1] * size - size * 0.1})`}
        >
          {glyph === 'flower' && <Flower colour={colour} size={size * 1.15} />}
          {glyph === 'fruit' && <Fruit colour={colour} size={size * 1.1} />}
          {glyph === 'leaf' && (
            <g transform={`rotate(${(right ? 1 : -1) * (spot[0] < 0 ? -60 : 55)})`}>
              <Leaf colour={colour} size={size * 1.2} />
            </g>
          )}
        </g>
      ))}
    </g>
  );
}

type OtherProps = {
  readonly it: Placed;
  readonly n: number;
  readonly at: TierBox;
  readonly above: TierBox | undefined;
  readonly right: boolean;
  readonly scale: number;
};

function Other({ it, n, at, above, right, scale }: OtherProps) {
  if (it.glyph === 'print') {
    const size = Math.min(at.width * 0.4, at.height * 0.7);
    return (
      <g transform={`translate(${at.x + at.width / 2} ${at.y + at.height / 2})`}>
        <Print colour={it.colour} size={size} />
      </g>
    );
  }
  // On a lower tier the other side of the ledge from the flowers; on top about the middle.
  const x =
    above === undefined
      ? at.x + at.width * (0.4 + 0.14 * n) - (it.glyph === 'topper' ? at.width * -0.06 : 0)
      : right
        ? (at.x + above.x) / 2
        : (at.x + at.width + above.x + above.width) / 2;
  return (
    <g transform={`translate(${x} ${at.y + 1})`}>
      {it.glyph === 'figure' ? (
        <Figure colour={it.colour} size={figureSize(scale)} />
      ) : (
        <Topper colour={it.colour} size={topperSize(scale)} />
      )}
    </g>
  );
}
