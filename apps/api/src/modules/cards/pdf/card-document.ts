import PDFDocument from 'pdfkit';
import { cardFonts, ptPerMm, type FontName } from './fonts.ts';
import type { Line, Measure } from './text-flow.ts';

export type PageMm = { readonly widthMm: number; readonly heightMm: number };

export type CardDocument = {
  readonly pdf: PDFKit.PDFDocument;
  readonly measure: Measure;
  addPage(page: PageMm): void;
  /** Text with its baseline at a place, points. */
  write(
    text: string,
    at: { readonly x: number; readonly baseline: number },
    face: { readonly font: FontName; readonly size: number; readonly colour: string },
  ): void;
  /** Lines one under another; returns where they end. */
  writeLines(lines: readonly Line[], x: number, y: number): number;
  /** The bytes, once nothing more is drawn. */
  end(): Promise<Buffer>;
};

/** An empty PDF that sets the house's faces; each page is added by whoever fills it. */
export function openCardDocument(title: string, author: string): CardDocument {
  const fonts = cardFonts();
  const pdf = new PDFDocument({
    autoFirstPage: false,
    compress: true,
    lang: 'en',
    displayTitle: true,
    info: { Title: title, Author: author },
  });
  const chunks: Buffer[] = [];
  const whole = new Promise<Buffer>((resolve, reject) => {
    pdf.on('data', (chunk: Buffer) => chunks.push(chunk));
    pdf.on('end', () => resolve(Buffer.concat(chunks)));
    pdf.on('error', reject);
  });
  for (const name of ['text', 'strong', 'display'] as const) {
    pdf.registerFont(name, fonts[name].bytes);
  }
  const measure: Measure = (text, font, size) => pdf.font(font).fontSize(size).widthOfString(text);
  const write: CardDocument['write'] = (text, { x, baseline }, { font, size, colour }) => {
    pdf
      .font(font)
      .fontSize(size)
      .fillColor(colour)
      .text(text, x, baseline, { lineBreak: false, baseline: 'alphabetic' });
  };
  return {
    pdf,
    measure,
    write,
    addPage({ widthMm, heightMm }) {
      pdf.addPage({ size: [widthMm * ptPerMm, heightMm * ptPerMm], margin: 0 });
    },
    writeLines(lines, x, y) {
      let top = y;
      lines.forEach((line, at) => {
        if (at > 0) top += line.gap;
        const size = Math.max(...line.runs.map((it) => it.size));
        // The letters sit in their line as type does: most of the leading under the baseline.
        const baseline = top + size * 0.92;
        for (const run of line.runs) write(run.text, { x: x + run.x, baseline }, run);
        top += line.height;
      });
      return top;
    },
    async end() {
      pdf.end();
      return whole;
    },
  };
}
