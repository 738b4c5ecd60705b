import { useMutation, useQueryClient } from '@tanstack/react-query';
import { allergyTable, type SaveAllergyTable } from '#shared/contracts/allergy-table.ts';
import { request } from '#web/lib/http.ts';
import { orderChanged, staffKeys } from '#web/lib/staff-keys.ts';
import { allergyTableQuery } from './get-allergy-table.ts';

function saveAllergyTable(body: SaveAllergyTable) {
  return request({
    method: 'PUT',
    path: '/api/staff/allergy-table',
    body,
    answer: allergyTable,
  });
}

/** Puts another table in its place; orders that wait are judged by it at once. */
export function useSaveAllergyTable() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: saveAllergyTable,
    onSuccess: async (table) => {
      client.setQueryData(allergyTableQuery().queryKey, table);
      await orderChanged(client);
    },
    onError: () => client.invalidateQueries({ queryKey: staffKeys.allergyTable }),
  });
}
