import type { CompareWords } from '#shared/kitchen/formulas/compare-versions.ts';
import type { StudioCard } from '#shared/contracts/menu.ts';

/** How this studio writes things. */
export type House = Pick<
  StudioCard,
  'locale' | 'zone' | 'labelRegion' | 'temperatureLead' | 'lengthLead'
>;

/** How differences between versions are said in this studio. */
export function compareWords(house: Pick<House, 'labelRegion' | 'temperatureLead'>): CompareWords {
  return { region: house.labelRegion, lead: house.temperatureLead };
}
