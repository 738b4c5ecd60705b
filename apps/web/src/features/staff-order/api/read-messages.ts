import type { StaffOrder } from '#shared/contracts/staff.ts';
import { sendToOrder, useOrderCommand } from './use-order-command.ts';

/** Notes that somebody in the studio has the customer's messages before their eyes. */
function readMessages(number: number): Promise<StaffOrder> {
  return sendToOrder(number, 'messages/read', undefined);
}

export function useReadMessages(number: number) {
  return useOrderCommand<void>(number, readMessages);
}
