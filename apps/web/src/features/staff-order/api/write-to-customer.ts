import type { WriteMessage } from '#shared/contracts/orders.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { sendToOrder, useOrderCommand } from './use-order-command.ts';

/** A message from the studio; it also goes by e-mail. */
export function writeToCustomer(number: number, body: WriteMessage): Promise<StaffOrder> {
  return sendToOrder(number, 'messages', body);
}

export function useWriteToCustomer(number: number) {
  return useOrderCommand(number, writeToCustomer);
}
