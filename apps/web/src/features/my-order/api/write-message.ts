import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type WriteMessage, orderView } from '#shared/contracts/orders.ts';
import { request } from '#web/lib/http.ts';
import { orderQuery } from './get-order.ts';

export function writeMessage(code: string, body: WriteMessage) {
  const path = `/api/orders/${encodeURIComponent(code)}/messages`;
  return request({ method: 'POST', path, body, answer: orderView });
}

/** Writes to the studio about the order. */
export function useWriteMessage(code: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: WriteMessage) => writeMessage(code, body),
    onSuccess: (order) => client.setQueryData(orderQuery(code).queryKey, order),
  });
}
