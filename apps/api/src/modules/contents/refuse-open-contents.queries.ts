import type { Order } from '#api/db/models/order.ts';
import { AppError } from '#api/platform/app-error.ts';
import { openContentsOf } from './content-changes.queries.ts';

const reasons = {
  'customer-untold':
    'Something in this cake has changed and the customer does not know yet. Tell them, and note how.',
  unacknowledged:
    'Something in this cake has changed, against what guests told. A baker has to see to it first.',
} as const;

/**
 * A cake whose contents changed does not leave before its customer knows.
 * @throws `advice-stop`
 */
export async function refuseOpenContents(order: Order): Promise<void> {
  const open = await openContentsOf(order.currentRevisionId);
  if (open !== null) throw new AppError('advice-stop', { detail: reasons[open] });
}
