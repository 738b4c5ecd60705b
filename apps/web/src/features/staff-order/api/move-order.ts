import type { MoveOrder, StaffOrder } from '#shared/contracts/staff.ts';
import { sendToOrder, useOrderCommand } from './use-order-command.ts';

/** Gives the order another pickup; the customer is told. */
export function moveOrder(number: number, body: MoveOrder): Promise<StaffOrder> {
  return sendToOrder(number, 'move', body);
}

export function useMoveOrder(number: number) {
  return useOrderCommand(number, moveOrder);
}
