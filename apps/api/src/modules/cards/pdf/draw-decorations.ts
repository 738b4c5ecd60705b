import type { Decoration } from '#shared/contracts/menu.ts';
import { lineOn, outlineOf, paper } from './ink.ts';

export type Box = {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
};

export type PlacedGlyph = {
  readonly glyph: Decoration['glyph'];
  readonly colour: string;
  readonly count: number;
};

type Pdf = PDFKit.PDFDocument;

/** What a decoration looks like until a colour is chosen for it, as on the screens. */
export const glyphColours: Readonly<Record<Decoration['glyph'], string>> = {
  flower: paper.butter,
  leaf: paper.leaf,
  pearl: paper.enamel,
  border: paper.enamel,
  figure: paper.cobaltTint,
  topper: paper.cobalt,
  fruit: paper.berry,
  drip: '#3A2318',
  print: paper.cobaltTint,
  ribbon: paper.cobalt,
  sprinkle: paper.berry,
};

/** What goes round a tier or over its edge. */
export function drawBand(pdf: Pdf, { glyph, colour }: PlacedGlyph, box: Box): void {
  const foot = box.y + box.height;
  const ink = (width: number) => pdf.lineWidth(width).fillAndStroke(colour, outlineOf(colour));
  switch (glyph) {
    case 'pearl':
    case 'border': {
      const radius = glyph === 'pearl' ? 1.9 : 2.8;
      const count = Math.max(3, Math.round(box.width / (radius * 2.1)));
      for (let at = 0; at < count; at += 1) {
        pdf.circle(box.x + ((at + 0.5) * box.width) / count, foot - radius * 0.8, radius);
      }
      ink(0.5);
      return;
    }
    case 'ribbon':
      pdf.rect(
        box.x,
        foot - Math.min(9, box.height * 0.2),
        box.width,
        Math.min(7, box.height * 0.16),
      );
      ink(0.5);
      return;
    case 'drip': {
      const count = Math.max(4, Math.round(box.width / 9));
      const step = box.width / count;
      for (let at = 0; at < count; at += 1) {
        const long = box.height * ([0.34, 0.18, 0.46, 0.24][at % 4] ?? 0.3);
        pdf.roundedRect(box.x + at * step + step * 0.15, box.y, step * 0.7, long, step * 0.33);
      }
      pdf.rect(box.x, box.y, box.width, 3.5).fill(colour);
      return;
    }
    case 'sprinkle': {
      const count = Math.max(8, Math.round(box.width / 5));
      for (let at = 0; at < count; at += 1) {
        // Steps by the plastic number scatter evenly, and always the same way.
        const x = box.x + 4 + ((at * 0.754878) % 1) * (box.width - 8);
        const y = foot - 3 - ((at * 0.56984) % 1) ** 1.6 * box.height * 0.4;
        pdf.moveTo(x - 1.2, y).lineTo(x + 1.2, y + (at % 2 === 0 ? 0.8 : -0.8));
      }
      pdf.lineWidth(1.1).strokeColor(colour).stroke();
      return;
    }
    default:
  }
}

/** What stands on a tier's top or ledge, about a point. */
export function drawStanding(
  pdf: Pdf,
  { glyph, colour }: PlacedGlyph,
  at: { readonly x: number; readonly y: number },
  size: number,
): void {
  const ink = () => pdf.lineWidth(0.5).fillAndStroke(colour, outlineOf(colour));
  switch (glyph) {
    case 'flower':
      for (let petal = 0; petal < 5; petal += 1) {
        const turn = (petal * 2 * Math.PI) / 5 - Math.PI / 2;
        pdf.circle(
          at.x + Math.cos(turn) * size * 0.28,
          at.y + Math.sin(turn) * size * 0.28,
          size * 0.26,
        );
        ink();
      }
      pdf.circle(at.x, at.y, size * 0.15).fill(lineOn(colour));
      return;
    case 'leaf':
      pdf
        .moveTo(at.x - size * 0.5, at.y + size * 0.2)
        .quadraticCurveTo(at.x, at.y - size * 0.6, at.x + size * 0.5, at.y - size * 0.1)
        .quadraticCurveTo(at.x, at.y + size * 0.5, at.x - size * 0.5, at.y + size * 0.2)
        .closePath();
      ink();
      return;
    case 'fruit':
      pdf.circle(at.x, at.y, size * 0.36);
      ink();
      return;
    case 'figure':
      pdf.circle(at.x, at.y - size * 0.95, size * 0.28);
      ink();
      pdf.roundedRect(at.x - size * 0.3, at.y - size * 0.7, size * 0.6, size * 0.95, size * 0.2);
      ink();
      return;
    case 'topper':
      pdf
        .moveTo(at.x, at.y + size * 0.2)
        .lineTo(at.x, at.y - size * 0.6)
        .lineWidth(0.9)
        .strokeColor(colour)
        .stroke();
      pdf.roundedRect(at.x - size * 0.7, at.y - size * 1.3, size * 1.4, size * 0.75, size * 0.3);
      ink();
      return;
    case 'print':
      pdf.roundedRect(at.x - size * 0.6, at.y - size * 0.6, size * 1.2, size * 1.2, 2);
      ink();
      return;
    default:
  }
}
