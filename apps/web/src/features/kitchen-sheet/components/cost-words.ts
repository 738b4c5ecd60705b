import type { CostLine } from '#shared/contracts/kitchen-sheet.ts';
import { figure } from '#web/lib/figure.ts';

/** What a line of the cost is called. */
export const costWords: Readonly<Record<CostLine['kind'], string>> = {
  ingredients: 'Ingredients',
  eggs: 'Eggs',
  packaging: 'Box and boards',
  decorations: 'Decoration materials',
  extras: 'Extras',
  labour: 'Work',
  overhead: 'Overhead',
};

/** "37.5 %", of parts per million, to a tenth. */
export function shareText(ppm: number, locale: string): string {
  return `${figure(ppm / 10_000, locale, 1)} %`;
}
