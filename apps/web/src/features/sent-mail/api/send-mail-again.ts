import { useMutation, useQueryClient } from '@tanstack/react-query';
import { done } from '#shared/contracts/common.ts';
import { request } from '#web/lib/http.ts';
import { orderChanged } from '#web/lib/staff-keys.ts';

/** Queues the same e-mail once more. */
export function sendMailAgain(id: string) {
  return request({
    method: 'POST',
    path: `/api/staff/mail/${encodeURIComponent(id)}/send-again`,
    answer: done,
  });
}

export function useSendMailAgain() {
  const client = useQueryClient();
  return useMutation({ mutationFn: sendMailAgain, onSuccess: () => orderChanged(client) });
}
