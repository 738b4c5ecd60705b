import { printable, type FontName } from './fonts.ts';

/** A stretch of text in one face; sizes in points. */
export type Run = {
  readonly text: string;
  readonly font: FontName;
  readonly size: number;
  readonly colour: string;
};

/** A paragraph, and the room above it. */
export type Block = {
  readonly runs: readonly Run[];
  readonly gap: number;
  /** Neighbours of one name stand in one column wherever a column holds them all. */
  readonly together?: string;
};

export type PlacedRun = Run & { readonly x: number };

export type Line = {
  readonly runs: readonly PlacedRun[];
  readonly height: number;
  /** Above it, where it is not the first of its column. */
  readonly gap: number;
  readonly together?: string;
};

/** Width of text in a face, points. */
export type Measure = (text: string, font: FontName, size: number) => number;

/** Baseline to baseline, as a part of the type size. */
export const leading = 1.18;

type Word = { readonly pieces: readonly Run[]; readonly width: number; readonly spaced: boolean };

/** Breaks paragraphs into lines of at most `width`. A word longer than a line is broken, never cut. */
export function breakLines(blocks: readonly Block[], width: number, measure: Measure): Line[] {
  return blocks.flatMap((block) => {
    const lines: Line[] = [];
    let runs: PlacedRun[] = [];
    let x = 0;
    const end = () => {
      if (runs.length === 0) return;
      const height = Math.max(...runs.map((it) => it.size)) * leading;
      lines.push({
        runs,
        height,
        gap: lines.length === 0 ? block.gap : 0,
        ...(block.together !== undefined && { together: block.together }),
      });
      runs = [];
      x = 0;
    };
    for (const word of wordsOf(block, width, measure)) {
      const first = word.pieces[0];
      const space =
        word.spaced && x > 0 && first !== undefined ? measure(' ', first.font, first.size) : 0;
      if (x > 0 && x + space + word.width > width) end();
      else x += space;
      for (const [at, piece] of word.pieces.entries()) {
        const last = runs.at(-1);
        const joined = (at === 0 && space > 0 ? ' ' : '') + piece.text;
        // Words of one face are one stretch: read aloud and copied, they stay words.
        if (last !== undefined && isSameFace(last, piece)) {
          runs[runs.length - 1] = { ...last, text: last.text + joined };
        } else runs.push({ ...piece, x });
        x += measure(piece.text, piece.font, piece.size);
      }
    }
    end();
    return lines;
  });
}

function isSameFace(one: Run, other: Run): boolean {
  return one.font === other.font && one.size === other.size && one.colour === other.colour;
}

/** Words across runs: what no space divides stays together, whatever faces it is set in. */
function wordsOf(block: Block, width: number, measure: Measure): Word[] {
  const words: { pieces: Run[]; spaced: boolean }[] = [];
  let open = false;
  let spaced = false;
  for (const run of block.runs) {
    for (const token of printable(run.text).split(/( +)/u)) {
      if (token === '') continue;
      if (token.startsWith(' ')) {
        open = false;
        spaced = true;
        continue;
      }
      const piece = { ...run, text: token };
      const last = words.at(-1);
      if (open && last !== undefined) last.pieces.push(piece);
      else words.push({ pieces: [piece], spaced });
      open = true;
      spaced = false;
    }
  }
  const widthOf = (pieces: readonly Run[]) =>
    pieces.reduce((sum, it) => sum + measure(it.text, it.font, it.size), 0);
  return words.flatMap(({ pieces, spaced: apart }): Word[] => {
    const whole = widthOf(pieces);
    if (whole <= width) return [{ pieces, width: whole, spaced: apart }];
    // Too long for a line by itself: letter by letter, so that lines break wherever they have to.
    return pieces
      .flatMap((piece) => [...piece.text].map((letter) => ({ ...piece, text: letter })))
      .map((piece, at) => ({
        pieces: [piece],
        width: widthOf([piece]),
        spaced: at === 0 && apart,
      }));
  });
}

/**
 * Fills columns of a height one after another; a line stands whole in one of them, and what belongs
 * together begins a new one rather than being parted, if one holds it.
 */
export function fillColumns(lines: readonly Line[], heights: (column: number) => number): Line[][] {
  const columns: Line[][] = [];
  let column: Line[] = [];
  let used = 0;
  for (const [at, line] of lines.entries()) {
    const gap = column.length === 0 ? 0 : line.gap;
    const kept = heightOf(beginningAt(lines, at));
    const needed = kept > heights(columns.length + 1) ? line.height : kept;
    if (column.length > 0 && used + gap + needed > heights(columns.length)) {
      columns.push(column);
      column = [];
      used = 0;
    }
    used += (column.length === 0 ? 0 : line.gap) + line.height;
    column.push(line);
  }
  if (column.length > 0) columns.push(column);
  return columns;
}

/** The lines that stay together from the one that begins them; any other line is by itself. */
function beginningAt(lines: readonly Line[], at: number): Line[] {
  const rest = lines.slice(at);
  const name = lines[at]?.together;
  if (name === undefined || lines[at - 1]?.together === name) return rest.slice(0, 1);
  const end = rest.findIndex((it) => it.together !== name);
  return end < 0 ? rest : rest.slice(0, end);
}

/** How high lines stand one under another, points. */
export function heightOf(lines: readonly Line[]): number {
  return lines.reduce((sum, line, at) => sum + line.height + (at === 0 ? 0 : line.gap), 0);
}
