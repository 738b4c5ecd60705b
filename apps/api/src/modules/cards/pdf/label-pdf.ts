import type { LabelPaper, LabelText } from '#shared/contracts/cards.ts';
import { AppError } from '#api/platform/app-error.ts';
import { openCardDocument, type CardDocument, type PageMm } from './card-document.ts';
import { ptPerMm, sizeForFigures, sizeForXHeight } from './fonts.ts';
import { paper } from './ink.ts';
import { labelBlocks, labelDates } from './label-blocks.ts';
import { breakLines, fillColumns, heightOf, leading, type Block, type Line } from './text-flow.ts';

/** How labels lie on a page, millimetres. */
type Sheet = PageMm & {
  readonly labelWidthMm: number;
  readonly labelHeightMm: number;
  readonly columns: number;
  readonly rows: number;
  readonly leftMm: number;
  readonly topMm: number;
  readonly gapMm: number;
};

/** One label of 100 x 62 mm; eight of 99.1 x 67.7 mm on A4; six of 4 x 3 1/3 in on US Letter. */
export const labelSheets: Readonly<Record<LabelPaper, Sheet>> = {
  single: {
    widthMm: 100,
    heightMm: 62,
    labelWidthMm: 100,
    labelHeightMm: 62,
    columns: 1,
    rows: 1,
    leftMm: 0,
    topMm: 0,
    gapMm: 0,
  },
  a4: {
    widthMm: 210,
    heightMm: 297,
    labelWidthMm: 99.1,
    labelHeightMm: 67.7,
    columns: 2,
    rows: 4,
    leftMm: 4.65,
    topMm: 13.1,
    gapMm: 2.5,
  },
  letter: {
    widthMm: 215.9,
    heightMm: 279.4,
    labelWidthMm: 101.6,
    labelHeightMm: 84.667,
    columns: 2,
    rows: 3,
    leftMm: 3.97,
    topMm: 12.7,
    gapMm: 4.76,
  },
};

/** The rim, and the words inside it. */
const rimMm = 1.8;
const paddingMm = 4;

/** More type than this above the smallest is no easier to read on a label. */
const largestTimes = 1.35;

/** A text that runs on over more labels than this belongs on a sheet of its own. */
const mostLabels = 6;

/** One label, or one of several that a text runs over. */
type Panel = {
  readonly label: LabelText;
  readonly lines: readonly Line[];
  readonly at: number;
  readonly of: number;
  readonly size: number;
};

export type LabelJob = {
  readonly label: LabelText;
  readonly copies: number;
};

export type LabelPrint = {
  readonly paper: LabelPaper;
  /** The first free place of the first sheet, from 1. */
  readonly start: number;
  readonly locale: string;
  readonly title: string;
};

/**
 * Labels as a PDF. Type is as large as fits on one label and never smaller than the law has it; what
 * does not fit then runs on to further labels and is never cut.
 * @throws `invalid-input` where not even that will do
 */
export async function labelsPdf(jobs: readonly LabelJob[], print: LabelPrint): Promise<Buffer> {
  const sheet = labelSheets[print.paper];
  const document = openCardDocument(print.title, jobs[0]?.label.studio.name ?? '');
  const panels = jobs.flatMap(({ label, copies }) => {
    const set = layOutLabel(label, sheet, document, print.locale);
    return Array.from({ length: copies }, () => set).flat();
  });
  const perPage = sheet.columns * sheet.rows;
  let place = Math.min(print.start, perPage) - 1;
  let open = false;
  for (const panel of panels) {
    if (!open || place === perPage) {
      document.addPage(sheet);
      if (open) place = 0;
      open = true;
    }
    drawPanel(panel, cornerOf(place, sheet), sheet, document, print.locale);
    place += 1;
  }
  if (!open) document.addPage(sheet);
  return document.end();
}

function cornerOf(place: number, sheet: Sheet): { x: number; y: number } {
  const column = place % sheet.columns;
  const row = Math.floor(place / sheet.columns);
  return {
    x: (sheet.leftMm + column * (sheet.labelWidthMm + sheet.gapMm)) * ptPerMm,
    y: (sheet.topMm + row * sheet.labelHeightMm) * ptPerMm,
  };
}

/** Sets one label's words at the largest size at which they fit, or over several labels. */
function layOutLabel(
  label: LabelText,
  sheet: Sheet,
  document: CardDocument,
  locale: string,
): Panel[] {
  const smallest = sizeForXHeight(label.smallestXHeightMm);
  const width = (sheet.labelWidthMm - 2 * paddingMm) * ptPerMm;
  const height = (sheet.labelHeightMm - 2 * paddingMm) * ptPerMm;
  const steps = 8;
  for (let step = steps; step >= 0; step -= 1) {
    const size = smallest * (1 + ((largestTimes - 1) * step) / steps);
    const lines = breakLines(labelBlocks(label, size), width, document.measure);
    const foot = heightOf(footOf(label, width, size, document, locale)) + size * 0.6;
    const continued = size * leading * 1.3;
    const heights = (panel: number) => (panel === 0 ? height - foot : height - continued);
    if (heights(0) < size * 2 * leading) throw tooMuch(label);
    const columns = fillColumns(lines, heights);
    if (columns.length === 1 || step === 0) {
      if (columns.length > mostLabels) throw tooMuch(label);
      return columns.map((it, at) => ({ label, lines: it, at, of: columns.length, size }));
    }
  }
  throw tooMuch(label);
}

function tooMuch(label: LabelText): AppError {
  const message = `The label of ${label.about} does not fit on labels of this size in the smallest type the law allows. Take the larger labels of a sheet.`;
  return new AppError('invalid-input', { issues: [{ path: ['paper'], message }] });
}

/** What stands at the foot of the first label: dates, and the net weight in the law's figures. */
function footOf(
  label: LabelText,
  width: number,
  size: number,
  { measure }: CardDocument,
  locale: string,
): Line[] {
  const dates = labelDates(label, locale).join(' \u00b7 ');
  const figures = Math.max(sizeForFigures(label.smallestFigureMm), size);
  const foot: Block[] = [
    { runs: [{ text: dates, font: 'strong', size, colour: paper.ink }], gap: 0 },
    { runs: [{ text: label.net.text, font: 'display', size: figures, colour: paper.ink }], gap: 0 },
  ];
  return breakLines(foot, width, measure);
}

function drawPanel(
  { label, lines, at, of, size }: Panel,
  corner: { readonly x: number; readonly y: number },
  sheet: Sheet,
  document: CardDocument,
  locale: string,
): void {
  const { pdf } = document;
  const width = sheet.labelWidthMm * ptPerMm;
  const height = sheet.labelHeightMm * ptPerMm;
  const rim = rimMm * ptPerMm;
  const padding = paddingMm * ptPerMm;
  const inner = width - 2 * padding;
  pdf
    .roundedRect(corner.x + rim, corner.y + rim, width - 2 * rim, height - 2 * rim, 3 * ptPerMm)
    .lineWidth(1.4)
    .strokeColor(paper.cobalt)
    .stroke();
  const x = corner.x + padding;
  let y = corner.y + padding;
  if (at > 0) {
    const head = `${label.about}, ${at + 1} of ${of}`;
    document.write(
      head,
      { x, baseline: y + size * 0.92 },
      { font: 'strong', size, colour: paper.cobalt },
    );
    y += size * leading * 1.3;
  }
  document.writeLines(lines, x, y);
  if (at > 0) return;
  const foot = footOf(label, inner, size, document, locale);
  const top = corner.y + height - padding - heightOf(foot);
  pdf
    .moveTo(x, top - size * 0.3)
    .lineTo(x + inner, top - size * 0.3)
    .lineWidth(0.6)
    .strokeColor(paper.seam)
    .stroke();
  document.writeLines(foot, x, top);
  if (of > 1) {
    const more = `1 of ${of}`;
    const wide = document.measure(more, 'strong', size);
    document.write(
      more,
      { x: x + inner - wide, baseline: corner.y + padding + size * 0.92 },
      { font: 'strong', size, colour: paper.cobalt },
    );
  }
}
