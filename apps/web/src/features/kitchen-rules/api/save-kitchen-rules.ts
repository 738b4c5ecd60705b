import { useMutation, useQueryClient } from '@tanstack/react-query';
import { kitchenSettings, type SaveKitchenRules } from '#shared/contracts/kitchen-rules.ts';
import { request } from '#web/lib/http.ts';
import { orderChanged, staffKeys } from '#web/lib/staff-keys.ts';
import { kitchenRulesQuery } from './get-kitchen-rules.ts';

function saveKitchenRules(body: SaveKitchenRules) {
  return request({
    method: 'PUT',
    path: '/api/staff/kitchen-rules',
    body,
    answer: kitchenSettings,
  });
}

/** Puts other figures in their place; everything reckoned with them is asked for again. */
export function useSaveKitchenRules() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: saveKitchenRules,
    onSuccess: async (settings) => {
      client.setQueryData(kitchenRulesQuery().queryKey, settings);
      await Promise.all([
        orderChanged(client),
        client.invalidateQueries({ queryKey: staffKeys.pantry }),
      ]);
    },
    onError: () => client.invalidateQueries({ queryKey: staffKeys.kitchenRules }),
  });
}
