import type { MarkOrder, StaffOrder } from '#shared/contracts/staff.ts';
import { sendToOrder, useOrderCommand } from './use-order-command.ts';

/** A new private link goes to the customer; the old one opens nothing any more. */
export function renewLink(number: number, body: MarkOrder): Promise<StaffOrder> {
  return sendToOrder(number, 'link', body);
}

export function useRenewLink(number: number) {
  return useOrderCommand(number, renewLink);
}
