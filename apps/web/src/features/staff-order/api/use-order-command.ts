import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type StaffOrder, staffOrder } from '#shared/contracts/staff.ts';
import { ApiProblem, request } from '#web/lib/http.ts';
import { orderChanged, staffKeys } from '#web/lib/staff-keys.ts';
import { staffOrderQuery } from './get-staff-order.ts';

/** Sends one act on an order; every one answers the order as it then is. */
export function sendToOrder(number: number, act: string, body: unknown): Promise<StaffOrder> {
  return request({
    method: 'POST',
    path: `/api/staff/orders/${number}/${act}`,
    body,
    answer: staffOrder,
  });
}

/** The order is not what the page showed: it must be loaded again before anything is pressed. */
export function hasMovedOn(error: unknown): boolean {
  return (
    error instanceof ApiProblem &&
    ['changed-meanwhile', 'wrong-state', 'advice-stop', 'date-gone', 'not-found'].includes(
      error.code,
    )
  );
}

/** An act on one order as a mutation: takes over the answer, and loads again what it changed. */
export function useOrderCommand<B>(
  number: number,
  send: (number: number, body: B) => Promise<StaffOrder>,
) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: B) => send(number, body),
    onSuccess: (order) => {
      client.setQueryData(staffOrderQuery(number).queryKey, order);
      return orderChanged(client);
    },
    onError: (error) =>
      hasMovedOn(error)
        ? client.invalidateQueries({ queryKey: staffKeys.order(number) })
        : undefined,
  });
}
