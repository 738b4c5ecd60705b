import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type WithdrawOrder, orderView } from '#shared/contracts/orders.ts';
import { request } from '#web/lib/http.ts';
import { orderQuery } from './get-order.ts';

export function withdrawOrder(code: string, body: WithdrawOrder) {
  const path = `/api/orders/${encodeURIComponent(code)}/withdraw`;
  return request({ method: 'POST', path, body, answer: orderView });
}

/** Withdraws the order; whatever comes of it, the page shows the order as it stands. */
export function useWithdrawOrder(code: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: WithdrawOrder) => withdrawOrder(code, body),
    onSuccess: (order) => client.setQueryData(orderQuery(code).queryKey, order),
    onError: () => client.invalidateQueries({ queryKey: orderQuery(code).queryKey }),
  });
}
