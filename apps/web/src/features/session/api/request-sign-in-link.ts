import { useMutation } from '@tanstack/react-query';
import { type RequestSignInLink } from '#shared/contracts/accounts.ts';
import { done } from '#shared/contracts/common.ts';
import { request } from '#web/lib/http.ts';

/** Asks for a one-time link by e-mail; the answer never says whether the address is known. */
export function requestSignInLink(body: RequestSignInLink) {
  return request({ method: 'POST', path: '/api/session/links', body, answer: done });
}

export function useRequestSignInLink() {
  return useMutation({ mutationFn: requestSignInLink });
}
