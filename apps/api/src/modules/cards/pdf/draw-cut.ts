import type { BlockCut } from '#shared/kitchen/cutting/cut-block.ts';
import type { DowelPlace } from '#shared/kitchen/supports.ts';
import { paper } from './ink.ts';

/**
 * A block from above with every cut of the knife and every dowel in it, at a scale in points a
 * millimetre.
 */
export function drawCut(
  pdf: PDFKit.PDFDocument,
  { block, cuts }: BlockCut,
  dowels: readonly DowelPlace[],
  at: { readonly x: number; readonly y: number; readonly scale: number },
): void {
  const { scale } = at;
  const width = block.widthMm * scale;
  const height = block.depthMm * scale;
  if (block.shape === 'round') {
    pdf.circle(at.x + width / 2, at.y + width / 2, width / 2);
  } else pdf.rect(at.x, at.y, width, height);
  pdf.lineWidth(1.2).fillAndStroke(paper.cloud, paper.cobalt);
  for (const cut of cuts) {
    if (cut.kind === 'circle') {
      pdf.circle(at.x + cut.cx * scale, at.y + cut.cy * scale, cut.r * scale);
    } else {
      pdf
        .moveTo(at.x + cut.x1 * scale, at.y + cut.y1 * scale)
        .lineTo(at.x + cut.x2 * scale, at.y + cut.y2 * scale);
    }
  }
  pdf.lineWidth(0.7).strokeColor(paper.ink).stroke();
  for (const dowel of dowels) {
    pdf.circle(at.x + width / 2 + dowel.x * scale, at.y + height / 2 + dowel.y * scale, 1.6);
    pdf.fill(paper.berry);
  }
}
