import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type SecondFactorCode, sessionView } from '#shared/contracts/accounts.ts';
import { request } from '#web/lib/http.ts';
import { enterSession } from '../enter-session.ts';

/** The second factor: six figures, or a recovery code. */
export function passSecondFactor(body: SecondFactorCode) {
  return request({ method: 'POST', path: '/api/session/second-factor', body, answer: sessionView });
}

export function usePassSecondFactor() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: passSecondFactor,
    onSuccess: (session) => enterSession(client, session),
  });
}
