import { useMutation } from '@tanstack/react-query';
import { done } from '#shared/contracts/common.ts';
import { request } from '#web/lib/http.ts';

export function requestErasure() {
  return request({
    method: 'POST',
    path: '/api/account/erasure',
    body: { sure: true },
    answer: done,
  });
}

/** Asks for everything about oneself to be erased; an e-mail asks once more. */
export function useRequestErasure() {
  return useMutation({ mutationFn: requestErasure });
}
