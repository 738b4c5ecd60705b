import { useMutation } from '@tanstack/react-query';
import type * as z from 'zod/mini';
import type { requestPasswordReset as contract } from '#shared/contracts/accounts.ts';
import { done } from '#shared/contracts/common.ts';
import { request } from '#web/lib/http.ts';

/** Asks for a link to set a new password; always answered alike. */
export function requestPasswordReset(body: z.infer<typeof contract>) {
  return request({ method: 'POST', path: '/api/session/password-resets', body, answer: done });
}

export function useRequestPasswordReset() {
  return useMutation({ mutationFn: requestPasswordReset });
}
