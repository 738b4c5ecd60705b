import { useMutation, useQueryClient } from '@tanstack/react-query';
import { orderLabels } from '#shared/contracts/cards.ts';
import { request } from '#web/lib/http.ts';
import { labelsQuery } from './get-labels.ts';

/** The owner's word that what is not known may be printed so, for just these sentences. */
export function useConfirmUnknown(number: number) {
  const client = useQueryClient();
  const { queryKey } = labelsQuery(number);
  return useMutation({
    mutationFn: (sentences: readonly string[]) =>
      request({
        method: 'POST',
        path: `/api/staff/orders/${number}/labels/confirm-unknown`,
        body: { sentences },
        answer: orderLabels,
      }),
    onSuccess: (labels) => client.setQueryData(queryKey, labels),
    onError: () => client.invalidateQueries({ queryKey }),
  });
}
