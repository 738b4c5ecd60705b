import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type SignInWithPassword, sessionView } from '#shared/contracts/accounts.ts';
import { request } from '#web/lib/http.ts';
import { enterSession } from '../enter-session.ts';

/** Staff sign in with e-mail and password; a second factor may still be needed. */
export function signInWithPassword(body: SignInWithPassword) {
  return request({ method: 'POST', path: '/api/session/password', body, answer: sessionView });
}

export function useSignInWithPassword() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: signInWithPassword,
    onSuccess: (session) => enterSession(client, session),
  });
}
