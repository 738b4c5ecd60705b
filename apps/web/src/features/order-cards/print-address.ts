import type { CardPaper, LabelPaper } from '#shared/contracts/cards.ts';

export type LabelChoice = {
  readonly paper: LabelPaper;
  readonly label: string;
  readonly copies: number;
  /** The first free place on a sheet, from 1. */
  readonly start: number;
  readonly weighedG: number | null;
};

/** Where the labels lie as a PDF, with what was chosen. */
export function labelsAddress(number: number, choice: LabelChoice): string {
  const search = new URLSearchParams({
    paper: choice.paper,
    label: choice.label,
    copies: String(choice.copies),
  });
  if (choice.paper !== 'single') search.set('start', String(choice.start));
  if (choice.weighedG !== null) search.set('weighedG', String(choice.weighedG));
  return `/api/staff/orders/${number}/labels.pdf?${search}`;
}

/** Where the care card lies as a PDF. */
export function careCardAddress(
  number: number,
  choice: { readonly paper: CardPaper; readonly servedAt: number | null },
): string {
  const search = new URLSearchParams({ paper: choice.paper });
  if (choice.servedAt !== null) search.set('servedAt', String(choice.servedAt));
  return `/api/staff/orders/${number}/care-card.pdf?${search}`;
}
