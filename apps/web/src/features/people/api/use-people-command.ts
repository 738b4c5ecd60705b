import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { StaffPeople } from '#shared/contracts/accounts.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';
import { peopleQuery } from './get-people.ts';

/** Something done about the people; the server answers everybody as they then are. */
export function usePeopleCommand<V>(send: (variables: V) => Promise<StaffPeople>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: send,
    onSuccess: (people) => {
      client.setQueryData(peopleQuery().queryKey, people);
    },
    onError: () => client.invalidateQueries({ queryKey: staffKeys.people }),
  });
}
