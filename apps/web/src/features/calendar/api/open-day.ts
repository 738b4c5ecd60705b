import { useMutation, useQueryClient } from '@tanstack/react-query';
import { done } from '#shared/contracts/common.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';

/** Takes a closure back; the day is as its weekday is. */
export function openDay(closureId: string) {
  return request({
    method: 'DELETE',
    path: `/api/staff/closures/${encodeURIComponent(closureId)}`,
    answer: done,
  });
}

export function useOpenDay() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: openDay,
    onSuccess: () => client.invalidateQueries({ queryKey: staffKeys.calendar }),
  });
}
