import { useMutation, useQueryClient } from '@tanstack/react-query';
import { ownSessions } from '#shared/contracts/accounts.ts';
import { request } from '#web/lib/http.ts';
import { sessionsQuery } from './list-sessions.ts';

export function endSession(id: string) {
  const path = `/api/account/sessions/${encodeURIComponent(id)}`;
  return request({ method: 'DELETE', path, answer: ownSessions });
}

/** Signs another place out. */
export function useEndSession() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: endSession,
    onSuccess: (sessions) => client.setQueryData(sessionsQuery().queryKey, sessions),
  });
}
