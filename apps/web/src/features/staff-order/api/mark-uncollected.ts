import type { MarkOrder, StaffOrder } from '#shared/contracts/staff.ts';
import { sendToOrder, useOrderCommand } from './use-order-command.ts';

/** Nobody came for it. */
export function markUncollected(number: number, body: MarkOrder): Promise<StaffOrder> {
  return sendToOrder(number, 'uncollected', body);
}

export function useMarkUncollected(number: number) {
  return useOrderCommand(number, markUncollected);
}
