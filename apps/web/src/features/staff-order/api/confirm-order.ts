import type { ConfirmOrder, StaffOrder } from '#shared/contracts/staff.ts';
import { sendToOrder, useOrderCommand } from './use-order-command.ts';

/** Takes the order as it was sent; the customer is told. */
export function confirmOrder(number: number, body: ConfirmOrder): Promise<StaffOrder> {
  return sendToOrder(number, 'confirm', body);
}

export function useConfirmOrder(number: number) {
  return useOrderCommand(number, confirmOrder);
}
