import * as z from 'zod/mini';
import { priceBookContent, type PriceBookContent } from '#shared/contracts/prices.ts';

const key = 'price-book-draft';
const kept = z.object({ madeFrom: z.int(), content: priceBookContent });

/**
 * What was typed and not saved, over a visit to another page, as long as it is still written over
 * the same book. Figures that could not be read are not kept.
 */
export function readKeptDraft(madeFrom: number): PriceBookContent | null {
  try {
    const parsed = kept.safeParse(JSON.parse(window.sessionStorage.getItem(key) ?? 'null'));
    return parsed.success && parsed.data.madeFrom === madeFrom ? parsed.data.content : null;
  } catch {
    return null;
  }
}

export function keepDraft(madeFrom: number, content: PriceBookContent | null): void {
  try {
    if (content === null) window.sessionStorage.removeItem(key);
    else window.sessionStorage.setItem(key, JSON.stringify({ madeFrom, content }));
  } catch {
    // Storage that is shut or full costs a convenience, no more.
  }
}
