import type { DeclineOrder, StaffOrder } from '#shared/contracts/staff.ts';
import { sendToOrder, useOrderCommand } from './use-order-command.ts';

/** Says no, with a reason the customer reads. */
export function declineOrder(number: number, body: DeclineOrder): Promise<StaffOrder> {
  return sendToOrder(number, 'decline', body);
}

export function useDeclineOrder(number: number) {
  return useOrderCommand(number, declineOrder);
}
