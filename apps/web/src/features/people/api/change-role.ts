import { type ChangeRole, staffPeople } from '#shared/contracts/accounts.ts';
import { request } from '#web/lib/http.ts';
import { usePeopleCommand } from './use-people-command.ts';

type Changed = ChangeRole & { readonly id: string };

/** Gives somebody another role; they sign in again with it. */
export function changeRole({ id, ...body }: Changed) {
  return request({
    method: 'PUT',
    path: `/api/staff/people/${encodeURIComponent(id)}/role`,
    body,
    answer: staffPeople,
  });
}

export function useChangeRole() {
  return usePeopleCommand(changeRole);
}
