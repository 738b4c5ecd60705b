import type { LiftStop, StaffOrder } from '#shared/contracts/staff.ts';
import { sendToOrder, useOrderCommand } from './use-order-command.ts';

/** The owner takes an order against a stop; the reason stays and the customer reads it. */
export function liftStop(number: number, body: LiftStop): Promise<StaffOrder> {
  return sendToOrder(number, 'lift-stop', body);
}

export function useLiftStop(number: number) {
  return useOrderCommand(number, liftStop);
}
