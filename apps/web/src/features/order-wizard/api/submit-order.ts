import { useMutation, useQueryClient } from '@tanstack/react-query';
import { idempotencyHeader } from '#shared/contracts/headers.ts';
import { submittedOrder } from '#shared/contracts/orders.ts';
import { request } from '#web/lib/http.ts';

export type SubmitOrderRequest = {
  /** The order as JSON text, so that a second try sends exactly what the first one did. */
  readonly body: string;
  readonly key: string;
};

/** `POST /api/orders`: the same key twice is one order. */
export function submitOrder({ body, key }: SubmitOrderRequest) {
  const order: unknown = JSON.parse(body);
  return request({
    method: 'POST',
    path: '/api/orders',
    body: order,
    headers: { [idempotencyHeader]: key },
    answer: submittedOrder,
  });
}

export function useSubmitOrder() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: submitOrder,
    // A new order takes bench time and shows in the account.
    onSettled: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: ['dates'] }),
        client.invalidateQueries({ queryKey: ['account'] }),
      ]),
  });
}
