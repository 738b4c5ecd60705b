import type { CollectOrder, StaffOrder } from '#shared/contracts/staff.ts';
import { sendToOrder, useOrderCommand } from './use-order-command.ts';

/** The cake went out of the door: to whom, and in what condition. */
export function collectOrder(number: number, body: CollectOrder): Promise<StaffOrder> {
  return sendToOrder(number, 'collected', body);
}

export function useCollectOrder(number: number) {
  return useOrderCommand(number, collectOrder);
}
