import type { MarkOrder, StaffOrder } from '#shared/contracts/staff.ts';
import { sendToOrder, useOrderCommand } from './use-order-command.ts';

/** The cake is ready; the customer is told. */
export function readyOrder(number: number, body: MarkOrder): Promise<StaffOrder> {
  return sendToOrder(number, 'ready', body);
}

export function useReadyOrder(number: number) {
  return useOrderCommand(number, readyOrder);
}
