import type { CardPaper, LabelText } from '#shared/contracts/cards.ts';
import type { Pickup } from '#shared/contracts/orders.ts';
import { formatDay, formatTime, formatWindow } from '#shared/dates/format.ts';
import {
  cuttingPlanOf,
  portionsSentence,
  type PieceCut,
} from '#shared/kitchen/cutting/cutting-plan.ts';
import type { ResolvedDesign } from '#shared/kitchen/resolve-design.ts';
import { supportsOf, type DowelPlace } from '#shared/kitchen/supports.ts';
import type { PageMm } from './card-document.ts';
import {
  bodySize,
  listOn,
  openCareSheet,
  strongRun,
  textRun,
  type CareSheet,
} from './care-sheet.ts';
import { drawCake } from './draw-cake.ts';
import { drawCut } from './draw-cut.ts';
import { drawQr } from './draw-qr.ts';
import { printable } from './fonts.ts';
import { paper } from './ink.ts';
import { labelDates } from './label-blocks.ts';
import { breakLines, heightOf } from './text-flow.ts';

/** ISO 216 A5, and half a US Letter. */
const pages: Readonly<Record<CardPaper, PageMm>> = {
  a5: { widthMm: 148, heightMm: 210 },
  'half-letter': { widthMm: 139.7, heightMm: 215.9 },
};

export type CareCard = {
  readonly number: number;
  readonly resolved: ResolvedDesign;
  readonly label: LabelText;
  readonly pickup: Pickup;
  /** When it comes out of the fridge, minutes since midnight; null while nobody knows. */
  readonly fridgeUntil: number | null;
  readonly keepCool: string;
  /** Of the page about this cake. */
  readonly url: string;
};

/** The care card that goes home with a cake, as a PDF of two pages or as many as its words need. */
export async function careCardPdf(card: CareCard, size: CardPaper): Promise<Buffer> {
  const { studio } = card.resolved.menu;
  const sheet = openCareSheet(pages[size], `Care card No. ${card.number}`, studio.name);
  drawHead(sheet, card);
  drawFridge(sheet, card);
  drawFirst(sheet, card);
  drawContents(sheet, card);
  drawCutting(sheet, card);
  drawFoot(sheet, card);
  return sheet.document.end();
}

function drawHead(sheet: CareSheet, { number, resolved, label, pickup }: CareCard): void {
  const { document, x, width } = sheet;
  const { studio } = resolved.menu;
  const size = 15;
  document.write(
    printable(studio.name),
    { x, baseline: sheet.y() + size },
    { font: 'display', size, colour: paper.cobalt },
  );
  sheet.moveTo(sheet.y() + size * 1.5);
  sheet.paragraph([strongRun(`Care card No. ${number}. ${label.product}`, 9.5)], 1);
  const day = formatDay(pickup.date, { locale: studio.locale, year: true });
  sheet.paragraph([textRun(`Collected ${day}, ${formatWindow(pickup.start, pickup.minutes)}.`)], 4);
  const bottom = drawCake(document, resolved, { x, y: sheet.y(), width, height: 235 });
  sheet.moveTo(bottom + 2);
}

/** The one thing to remember, on butter. */
function drawFridge(sheet: CareSheet, card: CareCard): void {
  const { document, x, width } = sheet;
  const { pdf, measure } = document;
  const inner = width - 20;
  const head =
    card.fridgeUntil === null
      ? 'Keep it in the fridge'
      : `Leave it in the fridge until ${formatTime(card.fridgeUntil)}`;
  const lines = breakLines(
    [
      { runs: [{ text: head, font: 'display', size: 14, colour: paper.ink }], gap: 0 },
      { runs: [textRun(card.keepCool)], gap: 2 },
    ],
    inner,
    measure,
  );
  const height = heightOf(lines) + 14;
  sheet.need(height);
  pdf.roundedRect(x, sheet.y(), width, height, 6).fill(paper.butterTint);
  document.writeLines(lines, x + 10, sheet.y() + 7);
  sheet.moveTo(sheet.y() + height + 2);
}

function drawFirst(sheet: CareSheet, { label }: CareCard): void {
  const first = [...label.remove, ...label.cautions];
  if (first.length === 0) return;
  sheet.title('Before anybody eats');
  listOn(sheet, first);
}

function drawContents(sheet: CareSheet, { label, resolved }: CareCard): void {
  const { studio } = resolved.menu;
  sheet.title('What is in it');
  if (label.contains !== null) sheet.paragraph([strongRun(label.contains)]);
  for (const it of label.notKnown) sheet.paragraph([strongRun(it)]);
  if (label.mayContain !== null) sheet.paragraph([strongRun(label.mayContain)]);
  sheet.paragraph([
    strongRun('Ingredients: '),
    ...label.ingredients.map((it) => (it.emphasised ? strongRun(it.text) : textRun(it.text))),
  ]);
  const rest = [label.signpost, label.makersWarn, label.kitchen].filter((it) => it !== null);
  if (rest.length > 0) sheet.paragraph([textRun(rest.join(' '))]);
  if (studio.kitchenNotice !== '') sheet.paragraph([textRun(studio.kitchenNotice)]);
  const dates = labelDates(label, studio.locale);
  sheet.paragraph([strongRun([...dates, label.net.text].join('. ') + '.')]);
}

function drawCutting(sheet: CareSheet, { resolved }: CareCard): void {
  const plan = cuttingPlanOf(resolved.design, resolved.menu);
  if (plan === null) return;
  const lead = resolved.menu.studio.lengthLead;
  const dowels = supportsOf(resolved.tiers, resolved.menu.kitchen).perTier.map((it) =>
    it.dowels.flatMap((set) => [...set.at]),
  );
  const aside = [
    resolved.tiers.length > 1 ? 'Take the tiers apart first, from the top down. ' : '',
    dowels.some((it) => it.length > 0) ? 'Red dots are dowels: take them out. ' : '',
  ].join('');
  sheet.title('Cutting it', 120);
  sheet.paragraph([
    textRun(`${portionsSentence(plan, lead)} ${aside}All drawn to one scale, from above.`),
  ]);
  const widest = Math.max(1, ...plan.pieces.map((it) => it.cut?.block.widthMm ?? 0));
  const scale = Math.min(0.34, (sheet.width * 0.36) / widest);
  for (const piece of plan.pieces) {
    const standing = piece.kind === 'tier' ? (dowels[piece.index] ?? []) : [];
    drawPiece(sheet, piece, standing, { scale, room: widest * scale });
  }
}

function drawPiece(
  sheet: CareSheet,
  piece: PieceCut,
  dowels: readonly DowelPlace[],
  { scale, room }: { readonly scale: number; readonly room: number },
): void {
  const { document, x, width } = sheet;
  const indent = room + 12;
  const count = piece.count > 1 ? `${piece.count} × ` : '';
  const portions =
    piece.cut === null || piece.left !== null ? '' : `: ${piece.cut.portions} portions`;
  const lines = breakLines(
    [
      { runs: [strongRun(`${count}${piece.name}${portions}`)], gap: 0 },
      ...piece.steps.map((it) => ({ runs: [textRun(it)], gap: 2 })),
    ],
    width - indent,
    document.measure,
  );
  const drawn = piece.cut === null ? 0 : piece.cut.block.depthMm * scale;
  const height = Math.max(drawn, heightOf(lines)) + 8;
  sheet.need(height);
  const top = sheet.y();
  if (piece.cut !== null) {
    const across = piece.cut.block.widthMm * scale;
    drawCut(document.pdf, piece.cut, dowels, { x: x + (room - across) / 2, y: top + 1, scale });
  }
  document.writeLines(lines, x + indent, top);
  sheet.moveTo(top + height);
}

/** The code of the cake's page, beside who made it. */
function drawFoot(sheet: CareSheet, { label, url, resolved }: CareCard): void {
  const { document, x, width } = sheet;
  const { studio } = resolved.menu;
  const side = 84;
  const made = [studio.phone, label.homeKitchen].filter((it) => it !== '');
  const lines = breakLines(
    [
      { runs: [strongRun('This cake on your phone')], gap: 0 },
      { runs: [textRun('Scan the code: what is in it, how to keep and cut it.')], gap: 1 },
      { runs: [textRun(`${studio.name}, ${label.studio.address}`, 7.6)], gap: 5 },
      ...made.map((it) => ({ runs: [textRun(it, 7.6)], gap: 1 })),
      {
        runs: [
          textRun('Local food rules and your doctor’s word come before anything said here.', 7.6),
        ],
        gap: 3,
      },
    ],
    width - side - 14,
    document.measure,
  );
  const height = Math.max(side, heightOf(lines)) + 6;
  sheet.need(height);
  // At the foot of the page it comes to stand on.
  const top = sheet.y() + sheet.left() - height;
  drawQr(document.pdf, url, { x: x + width - side, y: top + height - side, side });
  document.pdf
    .moveTo(x, top - 2)
    .lineTo(x + width, top - 2)
    .lineWidth(0.6)
    .strokeColor(paper.seam)
    .stroke();
  document.writeLines(lines, x, top + height - heightOf(lines) - bodySize * 0.3);
}
