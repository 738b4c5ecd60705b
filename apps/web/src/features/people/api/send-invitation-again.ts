import { staffPeople } from '#shared/contracts/accounts.ts';
import { request } from '#web/lib/http.ts';
import { usePeopleCommand } from './use-people-command.ts';

/** Sends an invitation again; the earlier link stops working. */
export function sendInvitationAgain(id: string) {
  return request({
    method: 'POST',
    path: `/api/staff/people/${encodeURIComponent(id)}/invitation`,
    answer: staffPeople,
  });
}

export function useSendInvitationAgain() {
  return usePeopleCommand(sendInvitationAgain);
}
