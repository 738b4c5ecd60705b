import { useId } from 'react';
import type { BlockCut, Cut } from '#shared/kitchen/cutting/cut-block.ts';
import type { DowelPlace } from '#shared/kitchen/supports.ts';

type Props = {
  readonly cut: BlockCut;
  /** For those who cannot see it: what it is, and how it is cut. */
  readonly title: string;
  readonly steps: readonly string[];
  /** Dowels that stand in it, from its middle. */
  readonly dowels: readonly DowelPlace[];
  /** Width of the widest piece of the plan, so that all are drawn to one scale. */
  readonly widestMm: number;
};

/** The outline is drawn half outside its edge, and a dowel may stand near it. */
const marginMm = 4;

/** One piece of cake from above, to scale: where the knife goes and where dowels stand. */
export function CutDrawing({ cut, title, steps, dowels, widestMm }: Props) {
  const id = useId();
  const { shape, widthMm, depthMm } = cut.block;
  const width = widthMm + 2 * marginMm;
  // Every drawing has the widest one's units, so a line is as strong in each.
  const stroke = widestMm / 190;
  return (
    <svg
      viewBox={`${-marginMm} ${-marginMm} ${width} ${depthMm + 2 * marginMm}`}
      role="img"
      aria-labelledby={`${id}-title`}
      aria-describedby={`${id}-words`}
      className="block"
      style={{ width: `${(100 * width) / (widestMm + 2 * marginMm)}%` }}
    >
      <title id={`${id}-title`}>{title}</title>
      <desc id={`${id}-words`}>{steps.join(' ')}</desc>
      <g stroke="var(--color-ink)" strokeWidth={1.6 * stroke} fill="var(--color-butter-tint)">
        {shape === 'round' ? (
          <circle cx={widthMm / 2} cy={depthMm / 2} r={widthMm / 2} />
        ) : (
          <rect width={widthMm} height={depthMm} rx="2" />
        )}
      </g>
      <g stroke="var(--color-ink)" strokeWidth={0.9 * stroke} fill="none">
        {cut.cuts.map((it, n) => (
          <CutLine key={n} cut={it} />
        ))}
      </g>
      <g fill="var(--color-berry)" stroke="var(--color-enamel)" strokeWidth={0.8 * stroke}>
        {dowels.map(({ x, y }, n) => (
          <circle key={n} cx={widthMm / 2 + x} cy={depthMm / 2 + y} r={3.2 * stroke} />
        ))}
      </g>
    </svg>
  );
}

function CutLine({ cut }: { readonly cut: Cut }) {
  return cut.kind === 'circle' ? (
    <circle cx={cut.cx} cy={cut.cy} r={cut.r} />
  ) : (
    <line x1={cut.x1} y1={cut.y1} x2={cut.x2} y2={cut.y2} />
  );
}
