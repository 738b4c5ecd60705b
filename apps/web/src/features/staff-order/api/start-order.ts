import type { MarkOrder, StaffOrder } from '#shared/contracts/staff.ts';
import { sendToOrder, useOrderCommand } from './use-order-command.ts';

/** The cake is in the making. */
export function startOrder(number: number, body: MarkOrder): Promise<StaffOrder> {
  return sendToOrder(number, 'start', body);
}

export function useStartOrder(number: number) {
  return useOrderCommand(number, startOrder);
}
