import { openCardDocument, type CardDocument, type PageMm } from './card-document.ts';
import { ptPerMm, printable } from './fonts.ts';
import { paper } from './ink.ts';
import { breakLines, heightOf, type Block, type Line, type Run } from './text-flow.ts';

export const bodySize = 8.8;
const titleSize = 12.5;
const rimMm = 5;
const insideMm = 10;

/** A page of a card being filled from the top; opens the next one when there is no more room. */
export type CareSheet = {
  readonly document: CardDocument;
  readonly x: number;
  readonly width: number;
  /** Where the next thing goes. */
  y(): number;
  moveTo(y: number): void;
  /** Starts another page unless so much room is left. */
  need(height: number): void;
  /** What is left of this page. */
  left(): number;
  lines(lines: readonly Line[], indent?: number): void;
  paragraph(runs: readonly Run[], gap?: number): void;
  title(text: string, needed?: number): void;
};

export function openCareSheet(page: PageMm, title: string, studio: string): CareSheet {
  const document = openCardDocument(title, studio);
  const x = insideMm * ptPerMm;
  const width = (page.widthMm - 2 * insideMm) * ptPerMm;
  const bottom = (page.heightMm - insideMm) * ptPerMm;
  let pages = 0;
  let y = 0;
  const turn = () => {
    document.addPage(page);
    pages += 1;
    const rim = rimMm * ptPerMm;
    document.pdf
      .roundedRect(
        rim,
        rim,
        page.widthMm * ptPerMm - 2 * rim,
        page.heightMm * ptPerMm - 2 * rim,
        4 * ptPerMm,
      )
      .lineWidth(2)
      .strokeColor(paper.cobalt)
      .stroke();
    y = insideMm * ptPerMm;
    if (pages === 1) return;
    document.write(
      printable(`${title}, page ${pages}`),
      { x, baseline: y + 7 },
      { font: 'strong', size: 8, colour: paper.cobalt },
    );
    y += 18;
  };
  turn();
  const sheet: CareSheet = {
    document,
    x,
    width,
    y: () => y,
    moveTo(to) {
      y = to;
    },
    need(height) {
      if (y + height > bottom) turn();
    },
    left: () => bottom - y,
    lines(lines, indent = 0) {
      for (const [at, line] of lines.entries()) {
        const gap = at === 0 ? 0 : line.gap;
        sheet.need(gap + line.height);
        y += gap;
        y = document.writeLines([line], x + indent, y);
      }
    },
    paragraph(runs, gap = 4) {
      const lines = breakLines([{ runs, gap: 0 }], width, document.measure);
      sheet.lines(lines);
      y += gap;
    },
    title(text, needed = 30) {
      sheet.need(titleSize * 2 + needed);
      y += 7;
      document.write(
        printable(text),
        { x, baseline: y + titleSize * 0.9 },
        { font: 'display', size: titleSize, colour: paper.cobalt },
      );
      y += titleSize * 1.45;
    },
  };
  return sheet;
}

export function textRun(text: string, size = bodySize): Run {
  return { text, font: 'text', size, colour: paper.ink };
}

export function strongRun(text: string, size = bodySize): Run {
  return { text, font: 'strong', size, colour: paper.ink };
}

/** A short list, each entry behind a small square. */
export function listOn(sheet: CareSheet, entries: readonly string[]): void {
  const indent = 10;
  for (const entry of entries) {
    const block: Block = { runs: [textRun(entry)], gap: 0 };
    const lines = breakLines([block], sheet.width - indent, sheet.document.measure);
    sheet.need(Math.min(heightOf(lines), bodySize * 3));
    sheet.document.pdf
      .roundedRect(sheet.x + 1, sheet.y() + bodySize * 0.38, 4, 4, 1)
      .fill(paper.cobalt);
    sheet.lines(lines, indent);
    sheet.moveTo(sheet.y() + 3);
  }
}
