import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type SecondFactorCode, sessionView } from '#shared/contracts/accounts.ts';
import { request } from '#web/lib/http.ts';
import { sessionQuery } from './get-session.ts';

/** Takes the second factor off, with a code of it; refused where the studio requires one. */
export function removeSecondFactor(body: SecondFactorCode) {
  return request({
    method: 'POST',
    path: '/api/session/second-factor/removal',
    body,
    answer: sessionView,
  });
}

export function useRemoveSecondFactor() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: removeSecondFactor,
    onSuccess: (session) => client.setQueryData(sessionQuery().queryKey, session),
  });
}
