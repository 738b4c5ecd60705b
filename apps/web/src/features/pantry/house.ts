import type { StudioCard } from '#shared/contracts/menu.ts';

/** How this studio writes things. */
export type House = Pick<
  StudioCard,
  'locale' | 'zone' | 'labelRegion' | 'temperatureLead' | 'lengthLead'
>;
