import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';

export type PdfPage = {
  readonly widthMm: number;
  readonly heightMm: number;
  /** Its words in the order they were set, line breaks as spaces. */
  readonly text: string;
  /** Type sizes on it, points, with a stretch of text each. */
  readonly sizes: readonly { readonly pt: number; readonly text: string }[];
};

const mmPerPt = 25.4 / 72;

/** Reads a PDF back with a reader that is not the writer's. */
export async function readPdf(bytes: Uint8Array): Promise<PdfPage[]> {
  const task = getDocument({ data: Uint8Array.from(bytes), verbosity: 0 });
  const document = await task.promise;
  const pages: PdfPage[] = [];
  for (let at = 1; at <= document.numPages; at += 1) {
    const page = await document.getPage(at);
    const [left = 0, bottom = 0, right = 0, top = 0] = page.view;
    const { items } = await page.getTextContent();
    const pieces = items.flatMap((it) => ('str' in it && it.str.trim() !== '' ? [it] : []));
    pages.push({
      widthMm: (right - left) * mmPerPt,
      heightMm: (top - bottom) * mmPerPt,
      text: pieces
        .map((it) => it.str)
        .join(' ')
        .replace(/\s+/gu, ' '),
      sizes: pieces.map((it) => ({ pt: it.height, text: it.str })),
    });
  }
  await task.destroy();
  return pages;
}
