import { useMutation } from '@tanstack/react-query';
import type { ChangePassword } from '#shared/contracts/accounts.ts';
import { done } from '#shared/contracts/common.ts';
import { request } from '#web/lib/http.ts';

export function changePassword(body: ChangePassword) {
  return request({ method: 'POST', path: '/api/account/password', body, answer: done });
}

/** Staff change their password; their other sessions end. */
export function useChangePassword() {
  return useMutation({ mutationFn: changePassword });
}
