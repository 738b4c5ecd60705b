import { createContext, useContext } from 'react';
import type { PriceBookContent, PricesView } from '#shared/contracts/prices.ts';
import type { Menu } from '#shared/contracts/menu.ts';

/** The price book as it is being written. A figure that cannot be read is NaN until it can. */
export type PriceDraft = {
  readonly content: PriceBookContent;
  readonly prices: PricesView;
  readonly menu: Menu;
  readonly put: (change: Partial<PriceBookContent>) => void;
  /** What is wrong at a place of the book: "wordsMinor", "rush.0.addPpm". */
  readonly problemAt: (place: string) => string | undefined;
};

export const PriceDraftContext = createContext<PriceDraft | null>(null);

export function usePriceDraft(): PriceDraft {
  const draft = useContext(PriceDraftContext);
  if (draft === null) throw new Error('There is no price book being written here.');
  return draft;
}
