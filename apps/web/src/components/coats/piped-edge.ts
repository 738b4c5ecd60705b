import type { StyleId } from '#shared/contracts/vocabulary.ts';

/** One bead of an edge: its width against its height, and how to draw it. */
type Bead = {
  /** Beads are about this many times as wide as high. */
  readonly wide: number;
  /** The stroke from the bead's left foot to its right one; `at` tells beads apart. */
  readonly stroke: (width: number, height: number, at: number) => string;
};

/** American: a crust breaks into uneven little points. */
const americanHeights = [0.62, 1, 0.5, 0.86, 0.7, 0.95] as const;

/**
 * How each buttercream stands when it is piped (common practice, no source): the meringue of an
 * Italian draws to a point, a French holds plump shells, a Russian slumps into low rounds, a Swiss
 * lies like satin, a German waves softly, an American crusts into uneven points.
 */
const beads: Record<StyleId, Bead> = {
  italian: {
    wide: 0.95,
    stroke: (w, h) =>
      `c ${-w * 0.04} ${-h * 0.5} ${w * 0.4} ${-h * 0.42} ${w * 0.5} ${-h}` +
      ` c ${w * 0.1} ${h * 0.58} ${w * 0.54} ${h * 0.5} ${w * 0.5} ${h}`,
  },
  american: {
    wide: 0.8,
    stroke: (w, h, at) => {
      const peak = h * (americanHeights[at % americanHeights.length] ?? 1);
      const lean = at % 2 === 0 ? 0.42 : 0.6;
      return `l ${w * lean} ${-peak} l ${w * (1 - lean)} ${peak}`;
    },
  },
  swiss: {
    wide: 4.2,
    stroke: (w, h, at) => {
      const lift = h * (at % 2 === 0 ? 0.42 : 0.62);
      return `c ${w * 0.26} ${-lift} ${w * 0.34} ${-lift} ${w * 0.5} ${-lift * 0.75} c ${w * 0.2} ${lift * 0.3} ${w * 0.3} ${lift * 0.75} ${w * 0.5} ${lift * 0.75}`;
    },
  },
  french: {
    wide: 1.25,
    stroke: (w, h) =>
      `c ${-w * 0.1} ${-h * 0.62} ${w * 0.14} ${-h} ${w * 0.5} ${-h}` +
      ` c ${w * 0.36} 0 ${w * 0.6} ${h * 0.38} ${w * 0.5} ${h}`,
  },
  german: {
    wide: 2.6,
    stroke: (w, h, at) => {
      const lift = h * (at % 2 === 0 ? 0.5 : 0.36);
      return `q ${w * 0.25} ${-lift} ${w * 0.5} ${-lift * 0.5} t ${w * 0.5} ${lift * 0.5}`;
    },
  },
  russian: {
    wide: 1.7,
    stroke: (w, h) =>
      `c ${w * 0.06} ${-h * 0.72} ${w * 0.3} ${-h * 0.72} ${w * 0.5} ${-h * 0.72} c ${w * 0.2} 0 ${w * 0.44} 0 ${w * 0.5} ${h * 0.72}`,
  },
};

/**
 * The strokes of a piped edge of that style, going right from the current point over `width` with
 * beads `height` high; ends level with where it began.
 */
export function pipedEdge(style: StyleId, width: number, height: number): string {
  const bead = beads[style];
  const count = Math.max(1, Math.round(width / (bead.wide * height)));
  return Array.from({ length: count }, (_, at) => bead.stroke(width / count, height, at)).join(' ');
}
