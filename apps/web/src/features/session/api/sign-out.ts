import { useMutation, useQueryClient } from '@tanstack/react-query';
import { sessionView } from '#shared/contracts/accounts.ts';
import { request } from '#web/lib/http.ts';
import { enterSession } from '../enter-session.ts';

/** Ends this session. */
export function signOut() {
  return request({ method: 'DELETE', path: '/api/session', answer: sessionView });
}

export function useSignOut() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: signOut,
    onSuccess: (session) => enterSession(client, session),
  });
}
