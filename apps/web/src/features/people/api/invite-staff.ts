import { type InviteStaff, staffPeople } from '#shared/contracts/accounts.ts';
import { request } from '#web/lib/http.ts';
import { usePeopleCommand } from './use-people-command.ts';

/** Invites somebody to work here, by e-mail. */
export function inviteStaff(body: InviteStaff) {
  return request({
    method: 'POST',
    path: '/api/staff/people/invitations',
    body,
    answer: staffPeople,
  });
}

export function useInviteStaff() {
  return usePeopleCommand(inviteStaff);
}
