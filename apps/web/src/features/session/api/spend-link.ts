import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type SpendLink, spentLink } from '#shared/contracts/accounts.ts';
import { request } from '#web/lib/http.ts';
import { enterSession } from '../enter-session.ts';

/** Spends a one-time link: signs in, or confirms what was asked for. */
export function spendLink(body: SpendLink) {
  return request({ method: 'POST', path: '/api/session/links/use', body, answer: spentLink });
}

export function useSpendLink() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: spendLink,
    onSuccess: ({ session }) => enterSession(client, session),
  });
}
