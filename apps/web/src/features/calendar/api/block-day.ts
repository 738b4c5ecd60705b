import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type BlockDay, blockedDay } from '#shared/contracts/staff.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';

/** Closes a day for new orders; answers which orders stand on it all the same. */
export function blockDay(body: BlockDay) {
  return request({ method: 'POST', path: '/api/staff/closures', body, answer: blockedDay });
}

export function useBlockDay() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: blockDay,
    onSuccess: () => client.invalidateQueries({ queryKey: staffKeys.calendar }),
  });
}
