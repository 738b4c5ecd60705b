import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type AcceptInvitation, sessionView } from '#shared/contracts/accounts.ts';
import { request } from '#web/lib/http.ts';
import { enterSession } from '../enter-session.ts';

/** Makes the staff account of an invitation, or the first owner, and signs it in. */
export function acceptInvitation(body: AcceptInvitation) {
  return request({
    method: 'POST',
    path: '/api/session/invitations/use',
    body,
    answer: sessionView,
  });
}

export function useAcceptInvitation() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: acceptInvitation,
    onSuccess: (session) => enterSession(client, session),
  });
}
