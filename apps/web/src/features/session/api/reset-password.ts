import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type ResetPassword } from '#shared/contracts/accounts.ts';
import { done } from '#shared/contracts/common.ts';
import { request } from '#web/lib/http.ts';
import { sessionQuery } from './get-session.ts';

/** Sets a new password with the link; every session of the account ends. */
export function resetPassword(body: ResetPassword) {
  return request({ method: 'POST', path: '/api/session/password-resets/use', body, answer: done });
}

export function useResetPassword() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: resetPassword,
    onSuccess: () => client.invalidateQueries({ queryKey: sessionQuery().queryKey }),
  });
}
