import { staffPeople } from '#shared/contracts/accounts.ts';
import { request } from '#web/lib/http.ts';
import { usePeopleCommand } from './use-people-command.ts';

/** Ends a role and its sessions, or withdraws an invitation. */
export function endRole(id: string) {
  return request({
    method: 'DELETE',
    path: `/api/staff/people/${encodeURIComponent(id)}`,
    answer: staffPeople,
  });
}

export function useEndRole() {
  return usePeopleCommand(endRole);
}
