import { coatColour } from '#shared/kitchen/coat-colour.ts';
import { formatLength } from '#shared/kitchen/measures.ts';
import type { ResolvedDesign, ResolvedTier } from '#shared/kitchen/resolve-design.ts';
import { boardOf } from '#shared/kitchen/sizes.ts';
import type { CardDocument } from './card-document.ts';
import {
  drawBand,
  drawStanding,
  glyphColours,
  type Box,
  type PlacedGlyph,
} from './draw-decorations.ts';
import { printable } from './fonts.ts';
import { lineOn, mixed, outlineOf, paper } from './ink.ts';

/** Points a millimetre at most: a small cake is not blown up to fill the card. */
const largestScale = 0.75;
/** Room for what stands on top, and a dimension line's own height, points. */
const headroom = 26;
const measureStep = 13;
const boardPt = 4;

const standing: readonly string[] = ['flower', 'leaf', 'fruit', 'figure', 'topper', 'print'];

/**
 * The cake on show from the side, to one scale across and up, in its own colours: tiers on their
 * board, dummies hatched, its decorations and words, widths below and heights beside it. Returns how
 * far down it reaches.
 */
export function drawCake(document: CardDocument, resolved: ResolvedDesign, room: Box): number {
  const { pdf } = document;
  const { design, menu, tiers } = resolved;
  const board = design.cake === null ? null : boardOf(design.cake, menu);
  if (board === null || tiers.length === 0) return room.y;
  const lead = menu.studio.lengthLead;
  if (design.cake?.kind === 'sheet') return drawSheet(document, resolved, room);
  const side = 60;
  const widths = widthsOf(tiers);
  const below = boardPt + 8 + widths.length * measureStep;
  const totalMm = tiers.reduce((sum, it) => sum + it.block.heightMm, 0);
  const scale = Math.min(
    largestScale,
    (room.width - 2 * side) / board.widthMm,
    (room.height - below - headroom) / totalMm,
  );
  const middle = room.x + room.width / 2;
  const floor = room.y + headroom + totalMm * scale;
  let top = floor;
  const boxes = tiers.map((tier): Box => {
    const height = tier.block.heightMm * scale;
    const width = tier.block.widthMm * scale;
    top -= height;
    return { x: middle - width / 2, y: top, width, height };
  });
  pdf
    .roundedRect(middle - (board.widthMm * scale) / 2, floor, board.widthMm * scale, boardPt, 1.5)
    .fill(paper.ink);
  const glyphs = glyphsOf(resolved);
  tiers.forEach((tier, at) => {
    const box = boxes[at];
    if (box === undefined) return;
    drawTier(pdf, tier, resolved, box);
    for (const it of glyphs[at] ?? []) drawBand(pdf, it, box);
    drawWords(document, resolved, at, box);
  });
  tiers.forEach((_, at) => drawClusters(pdf, glyphs[at] ?? [], at, boxes));

  let y = floor + boardPt + 10;
  for (const { widthMm, text } of widths.map((mm) => ({
    widthMm: mm,
    text: formatLength(mm, lead),
  }))) {
    const half = (widthMm * scale) / 2;
    measureAcross(document, middle - half, middle + half, y, text);
    y += measureStep;
  }
  const right = middle + (Math.max(...boxes.map((it) => it.width)) / 2 + 12);
  measureUp(document, right, top, floor, formatLength(totalMm, lead));
  return y;
}

/** A sheet is looked at from above: its top is what there is to see. */
function drawSheet(document: CardDocument, resolved: ResolvedDesign, room: Box): number {
  const { pdf } = document;
  const [sheet] = resolved.tiers;
  if (sheet === undefined) return room.y;
  const { widthMm, depthMm } = sheet.block;
  const lead = resolved.menu.studio.lengthLead;
  const scale = Math.min((room.width - 150) / widthMm, 120 / depthMm);
  const width = widthMm * scale;
  const box = {
    x: room.x + (room.width - width) / 2,
    y: room.y + 12,
    width,
    height: depthMm * scale,
  };
  drawTier(pdf, sheet, resolved, box);
  const glyphs = glyphsOf(resolved)[0] ?? [];
  for (const it of glyphs) drawBand(pdf, it, box);
  // In the corners, where they leave the words alone.
  glyphs
    .filter(({ glyph }) => standing.includes(glyph))
    .forEach((it, at) => {
      const left = at % 2 === 0;
      const size = it.glyph === 'print' ? 20 : 13;
      for (let n = 0; n < (it.glyph === 'print' ? 1 : it.count); n += 1) {
        const x = left ? box.x + 16 + n * 9 : box.x + width - 16 - n * 9;
        drawStanding(pdf, it, { x, y: box.y + 17 + (n % 2) * 5 }, size);
      }
    });
  drawWords(document, resolved, 0, box);
  const below = box.y + box.height + 9;
  measureAcross(document, box.x, box.x + width, below, formatLength(widthMm, lead));
  measureUp(document, box.x + width + 9, box.y, box.y + box.height, formatLength(depthMm, lead));
  return below + measureStep;
}

/** Each width once, the widest last, so that lines below the cake grow outwards. */
function widthsOf(tiers: readonly ResolvedTier[]): number[] {
  return [...new Set(tiers.map((it) => it.block.widthMm))].sort((a, b) => a - b);
}

function drawTier(
  pdf: PDFKit.PDFDocument,
  tier: ResolvedTier,
  { menu }: ResolvedDesign,
  box: Box,
): void {
  const { coating, sponge, layers } = tier;
  const colour =
    coating === null
      ? (sponge?.colour ?? paper.cloud)
      : coatColour(menu, {
          covering: coating.covering.id,
          style: coating.style?.id ?? null,
          colour: coating.colour,
        });
  pdf.roundedRect(box.x, box.y, box.width, box.height, 3).fill(colour);
  if (coating?.covering.id === 'semi-naked' && sponge !== null) {
    const gap = 2;
    const each = (box.height - gap * (layers + 1)) / layers;
    for (let layer = 0; layer < layers; layer += 1) {
      const y = box.y + gap + layer * (each + gap);
      pdf.rect(box.x + 2, y, box.width - 4, each).fill(mixed(colour, sponge.colour, 0.55));
    }
  }
  if (!tier.real) hatch(pdf, box);
  if (coating?.finish === 'textured') {
    for (let y = box.y + 6; y < box.y + box.height - 3; y += 6) {
      pdf.moveTo(box.x + 2, y).lineTo(box.x + box.width - 2, y);
    }
    pdf.lineWidth(0.5).strokeColor(lineOn(colour)).stroke();
  }
  pdf
    .roundedRect(box.x, box.y, box.width, box.height, 3)
    .lineWidth(1)
    .strokeColor(outlineOf(colour))
    .stroke();
  if (coating?.finish === 'piped') {
    const piped = { glyph: 'border', colour, count: 1 } as const;
    drawBand(pdf, piped, box);
    drawBand(pdf, piped, { ...box, height: 3 });
  }
}

/** Dummies are hatched, so that nobody takes one for cake. */
function hatch(pdf: PDFKit.PDFDocument, box: Box): void {
  pdf.save();
  pdf.roundedRect(box.x, box.y, box.width, box.height, 3).clip();
  for (let x = box.x - box.height; x < box.x + box.width; x += 7) {
    pdf.moveTo(x, box.y + box.height).lineTo(x + box.height, box.y);
  }
  pdf.lineWidth(0.7).strokeColor(paper.slate).stroke();
  pdf.restore();
}

/** What goes on each tier from the board up; what goes on the whole is shared out. */
function glyphsOf({ tiers, decorations }: ResolvedDesign): PlacedGlyph[][] {
  const perTier: PlacedGlyph[][] = tiers.map(() => []);
  const last = tiers.length - 1;
  for (const { placed, decoration } of decorations) {
    const { glyph } = decoration;
    const entry: PlacedGlyph = {
      glyph,
      colour: placed.colour ?? glyphColours[glyph],
      count: decoration.per === 'piece' ? Math.min(4, placed.quantity) : 4,
    };
    const onTop = glyph === 'figure' || glyph === 'topper' || glyph === 'drip';
    const at =
      placed.tier !== null
        ? [Math.min(placed.tier, last)]
        : onTop
          ? [last]
          : glyph === 'print'
            ? [0]
            : tiers.map((it) => it.index);
    for (const tier of at) perTier[tier]?.push(entry);
  }
  return perTier;
}

/** Clusters on alternating sides of the ledges, toppers and figures on the middle of the top. */
function drawClusters(
  pdf: PDFKit.PDFDocument,
  glyphs: readonly PlacedGlyph[],
  at: number,
  boxes: readonly Box[],
): void {
  const box = boxes[at];
  if (box === undefined) return;
  const above = boxes[at + 1];
  const right = at % 2 === 0;
  const edge =
    above === undefined
      ? box.x + box.width * (right ? 0.68 : 0.32)
      : right
        ? above.x + above.width
        : above.x;
  let spot = 0;
  for (const it of glyphs.filter(({ glyph }) => standing.includes(glyph))) {
    if (it.glyph === 'print') {
      drawStanding(pdf, it, { x: box.x + box.width / 2, y: box.y + box.height / 2 }, 16);
    } else if (it.glyph === 'figure' || it.glyph === 'topper') {
      drawStanding(pdf, it, { x: box.x + box.width * 0.45, y: box.y - 2 }, 14);
    } else {
      for (let n = 0; n < it.count; n += 1) {
        const way = (right ? 1 : -1) * ((spot % 2 === 0 ? -1 : 1) * Math.ceil(spot / 2));
        drawStanding(pdf, it, { x: edge + way * 7, y: box.y - 3 - (spot % 3) * 2.5 }, 13);
        spot += 1;
      }
    }
  }
}

function drawWords(document: CardDocument, { design }: ResolvedDesign, at: number, box: Box): void {
  const lines = (design.look?.words ?? []).filter((it) => it.tier === at && it.text !== '');
  const size = Math.max(5.5, Math.min(10, box.height / (lines.length + 2.2)));
  lines.forEach(({ text }, n) => {
    const room = box.width - 8;
    const shown = printable(text);
    const wide = document.measure(shown, 'display', size);
    const fits = wide <= room ? size : (size * room) / wide;
    const width = document.measure(shown, 'display', fits);
    document.write(
      shown,
      {
        x: box.x + (box.width - width) / 2,
        baseline: box.y + box.height / 2 + (n - (lines.length - 1) / 2) * size * 1.2 + fits * 0.35,
      },
      { font: 'display', size: fits, colour: paper.ink },
    );
  });
}

const figures = { font: 'text', size: 7.5, colour: paper.cobalt } as const;

function measureAcross(
  document: CardDocument,
  from: number,
  to: number,
  y: number,
  text: string,
): void {
  const { pdf } = document;
  const wide = document.measure(printable(text), figures.font, figures.size);
  const middle = (from + to) / 2;
  pdf.moveTo(from, y - 3).lineTo(from, y + 3);
  pdf.moveTo(to, y - 3).lineTo(to, y + 3);
  pdf.moveTo(from, y).lineTo(Math.max(from, middle - wide / 2 - 3), y);
  pdf.moveTo(Math.min(to, middle + wide / 2 + 3), y).lineTo(to, y);
  pdf.lineWidth(0.7).strokeColor(paper.cobalt).stroke();
  document.write(printable(text), { x: middle - wide / 2, baseline: y + 2.6 }, figures);
}

function measureUp(
  document: CardDocument,
  x: number,
  from: number,
  to: number,
  text: string,
): void {
  const { pdf } = document;
  pdf.moveTo(x - 3, from).lineTo(x + 3, from);
  pdf.moveTo(x - 3, to).lineTo(x + 3, to);
  pdf.moveTo(x, from).lineTo(x, to);
  pdf.lineWidth(0.7).strokeColor(paper.cobalt).stroke();
  document.write(printable(text), { x: x + 6, baseline: (from + to) / 2 + 2.6 }, figures);
}
