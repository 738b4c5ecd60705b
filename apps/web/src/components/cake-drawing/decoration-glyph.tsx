import type { Decoration } from '#shared/contracts/menu.ts';
import { classNames } from '#web/lib/class-names.ts';
import { lineOn, outlineOf } from '#web/components/coats/shades.ts';

export type GlyphKind = Decoration['glyph'];

/** What a decoration looks like until a colour is chosen for it. */
export const glyphColours: Record<GlyphKind, string> = {
  flower: 'var(--color-butter)',
  leaf: 'var(--color-leaf)',
  pearl: 'var(--color-enamel)',
  border: 'var(--color-enamel)',
  figure: 'var(--color-cobalt-tint)',
  topper: 'var(--color-cobalt)',
  fruit: 'var(--color-berry)',
  drip: 'var(--color-ink)',
  print: 'var(--color-cobalt-tint)',
  ribbon: 'var(--color-cobalt)',
  sprinkle: 'var(--color-berry)',
};

type FigureProps = { readonly colour: string; readonly size: number };

/** Five petals about a heart; the middle at 0,0 and `size` across. */
export function Flower({ colour, size }: FigureProps) {
  const petal = size * 0.27;
  return (
    <g strokeWidth="0.9" style={{ stroke: outlineOf(colour) }}>
      {[0, 72, 144, 216, 288].map((turn) => (
        <ellipse
          key={turn}
          cx="0"
          cy={-size * 0.27}
          rx={petal * 0.9}
          ry={petal}
          fill={colour}
          transform={`rotate(${turn})`}
        />
      ))}
      <circle r={size * 0.15} style={{ fill: lineOn(colour) }} />
    </g>
  );
}

/** A leaf with its rib, pointing up and away. */
export function Leaf({ colour, size }: FigureProps) {
  const half = size / 2;
  return (
    <g strokeWidth="0.9" style={{ stroke: outlineOf(colour) }}>
      <path
        d={`M0 ${half}C${-half * 0.95} ${half * 0.3} ${-half * 0.8} ${-half * 0.6} 0 ${-half}C${half * 0.8} ${-half * 0.6} ${half * 0.95} ${half * 0.3} 0 ${half}z`}
        fill={colour}
      />
      <path d={`M0 ${half}V${-half * 0.45}`} fill="none" />
    </g>
  );
}

/** A berry with its little crown. */
export function Fruit({ colour, size }: FigureProps) {
  const r = size * 0.38;
  return (
    <g strokeWidth="0.9" style={{ stroke: outlineOf(colour) }}>
      <circle r={r} fill={colour} />
      <path
        d={`M0 ${-r}l${-r * 0.5} ${-r * 0.35}M0 ${-r}l${r * 0.5} ${-r * 0.35}M0 ${-r}v${-r * 0.55}`}
        fill="none"
        strokeLinecap="round"
        strokeWidth="1.2"
        style={{ stroke: 'var(--color-leaf)' }}
      />
      <path
        d={`M${-r * 0.45} ${-r * 0.1}a${r * 0.5} ${r * 0.5} 0 0 1 ${r * 0.4} ${-r * 0.45}`}
        fill="none"
        stroke="var(--color-enamel)"
        strokeLinecap="round"
      />
    </g>
  );
}

/** A modelled little bear, standing with its feet at 0,0. */
export function Figure({ colour, size }: FigureProps) {
  return (
    <g strokeWidth="1" style={{ stroke: outlineOf(colour) }} fill={colour}>
      <ellipse cx="0" cy={-size * 0.3} rx={size * 0.27} ry={size * 0.31} />
      <circle cx={-size * 0.17} cy={-size * 0.93} r={size * 0.09} />
      <circle cx={size * 0.17} cy={-size * 0.93} r={size * 0.09} />
      <circle cx="0" cy={-size * 0.76} r={size * 0.23} />
      <g stroke="none" fill="var(--color-ink)">
        <circle cx={-size * 0.08} cy={-size * 0.79} r={size * 0.026} />
        <circle cx={size * 0.08} cy={-size * 0.79} r={size * 0.026} />
        <ellipse cx="0" cy={-size * 0.7} rx={size * 0.04} ry={size * 0.028} />
      </g>
    </g>
  );
}

/** A heart on a stick, the stick's foot at 0,0. */
export function Topper({ colour, size }: FigureProps) {
  const s = size * 0.3;
  return (
    <g>
      <path d={`M0 0V${-size * 0.6}`} stroke="var(--color-ink)" strokeWidth="1.4" />
      <path
        d={`M0 ${-size * 0.38}C${-s * 1.5} ${-size * 0.62} ${-s * 1.3} ${-size * 1.05} ${-s * 0.55} ${-size}C${-s * 0.2} ${-size * 0.98} 0 ${-size * 0.9} 0 ${-size * 0.84}C0 ${-size * 0.9} ${s * 0.2} ${-size * 0.98} ${s * 0.55} ${-size}C${s * 1.3} ${-size * 1.05} ${s * 1.5} ${-size * 0.62} 0 ${-size * 0.38}z`}
        fill={colour}
        strokeWidth="1"
        style={{ stroke: outlineOf(colour) }}
      />
    </g>
  );
}

/** An edible picture in its frame, the middle at 0,0. */
export function Print({ colour, size }: FigureProps) {
  const w = size;
  const h = size * 0.75;
  return (
    <g strokeWidth="1" style={{ stroke: outlineOf(colour) }}>
      <rect x={-w / 2} y={-h / 2} width={w} height={h} rx="1.5" fill="var(--color-enamel)" />
      <path
        d={`M${-w * 0.42} ${h * 0.36}L${-w * 0.14} ${-h * 0.08}L${w * 0.06} ${h * 0.16}L${w * 0.2} ${-h * 0.02}L${w * 0.42} ${h * 0.36}z`}
        fill={colour}
      />
      <circle cx={w * 0.22} cy={-h * 0.24} r={h * 0.1} fill="var(--color-butter)" />
    </g>
  );
}

/** One of our drawn figures by itself, for lists. Decoration: the name stands beside it. */
export function DecorationGlyph({
  glyph,
  colour,
  className,
}: {
  readonly glyph: GlyphKind;
  readonly colour?: string | null;
  readonly className?: string;
}) {
  const tint = colour ?? glyphColours[glyph];
  return (
    <svg
      viewBox="-16 -16 32 32"
      className={classNames('shrink-0', className ?? 'size-9')}
      aria-hidden="true"
    >
      <IconFigure glyph={glyph} colour={tint} />
    </svg>
  );
}

function IconFigure({ glyph, colour }: { readonly glyph: GlyphKind; readonly colour: string }) {
  const line = { stroke: outlineOf(colour) };
  switch (glyph) {
    case 'flower':
      return <Flower colour={colour} size={26} />;
    case 'leaf':
      return (
        <g transform="rotate(35)">
          <Leaf colour={colour} size={26} />
        </g>
      );
    case 'fruit':
      return <Fruit colour={colour} size={28} />;
    case 'figure':
      return (
        <g transform="translate(0 13)">
          <Figure colour={colour} size={26} />
        </g>
      );
    case 'topper':
      return (
        <g transform="translate(0 14)">
          <Topper colour={colour} size={27} />
        </g>
      );
    case 'print':
      return <Print colour={colour} size={28} />;
    case 'pearl':
      return (
        <g fill={colour} strokeWidth="1.1" style={line}>
          {[-10, 0, 10].map((x) => (
            <circle key={x} cx={x} cy={Math.abs(x) === 10 ? -2 : 3} r="4.6" />
          ))}
        </g>
      );
    case 'border':
      return (
        <path
          d="M-15 8c0-9 10-9 10 0c0-9 10-9 10 0c0-9 10-9 10 0z"
          fill={colour}
          strokeWidth="1.2"
          style={line}
        />
      );
    case 'drip':
      return (
        <path
          d="M-14-12h28v8c0 4-5 4-5 0v12c0 4-6 4-6 0v-10c0-3-5-3-5 0v5c0 4-6 4-6 0v-8c0-3-6-3-6 0z"
          fill={colour}
          strokeWidth="1"
          style={line}
        />
      );
    case 'ribbon':
      return (
        <g fill={colour} strokeWidth="1" style={line}>
          <path d="M-15-3h30v6h-30z" />
          <path d="M0 0c-4-9-12-8-10-1s6 4 10 1c4-9 12-8 10-1s-6 4-10 1zM0 0l-6 11 5-2zM0 0l6 11-5-2z" />
        </g>
      );
    case 'sprinkle':
      return (
        <g strokeWidth="2.6" strokeLinecap="round" fill="none">
          <path d="M-11-6l4-3M3-11l2 5M9 2l5-1" stroke={colour} />
          <path d="M-9 4l1 5M-1-1l5-1" stroke="var(--color-butter)" />
          <path d="M1 8l4 3M-3-8l-1 1M11-8l1 1" stroke="var(--color-cobalt)" />
        </g>
      );
  }
}
