import * as z from 'zod/mini';
import { localDate, minuteOfDay } from '#shared/contracts/common.ts';
import { submittedOrder } from '#shared/contracts/orders.ts';

/** What the page after sending tells; kept for this tab alone, since it holds the private key. */
const sentOrder = z.object({
  ...submittedOrder.shape,
  email: z.string(),
  date: localDate,
  windowStart: minuteOfDay,
  /** An earlier try had arrived after all; answers changed since then are not in it. */
  earlierTry: z.boolean(),
});
export type SentOrder = z.infer<typeof sentOrder>;

const storageKey = 'order-sent';

export function rememberSent(order: SentOrder): void {
  try {
    window.sessionStorage.setItem(storageKey, JSON.stringify(order));
  } catch {
    // The e-mail says the same.
  }
}

export function recallSent(): SentOrder | null {
  try {
    const parsed = sentOrder.safeParse(
      JSON.parse(window.sessionStorage.getItem(storageKey) ?? 'null'),
    );
    return parsed.success ? parsed.data : null;
  } catch {
    return null;
  }
}
