import QRCode from 'qrcode';
import { paper } from './ink.ts';

/**
 * A QR code (ISO/IEC 18004) of level M, drawn in squares into a box of that side, points, with the
 * four modules of quiet round it that a reader wants.
 */
export function drawQr(
  pdf: PDFKit.PDFDocument,
  text: string,
  box: { readonly x: number; readonly y: number; readonly side: number },
): void {
  const { modules } = QRCode.create(text, { errorCorrectionLevel: 'M' });
  const quiet = 4;
  const step = box.side / (modules.size + 2 * quiet);
  pdf.rect(box.x, box.y, box.side, box.side).fill(paper.enamel);
  for (let row = 0; row < modules.size; row += 1) {
    for (let from = 0; from < modules.size; from += 1) {
      if (modules.get(row, from) === 0) continue;
      let to = from;
      while (to + 1 < modules.size && modules.get(row, to + 1) !== 0) to += 1;
      // Neighbours in one stroke, and a hair over, so that no printer leaves seams.
      pdf.rect(
        box.x + (quiet + from) * step,
        box.y + (quiet + row) * step,
        (to - from + 1) * step,
        step * 1.02,
      );
      from = to;
    }
  }
  pdf.fill(paper.ink);
}
