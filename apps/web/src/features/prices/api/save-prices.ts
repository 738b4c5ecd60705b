import { useMutation, useQueryClient } from '@tanstack/react-query';
import { pricesView, type SavePrices } from '#shared/contracts/prices.ts';
import { request } from '#web/lib/http.ts';
import { orderChanged, staffKeys } from '#web/lib/staff-keys.ts';
import { pricesQuery } from './get-prices.ts';

/** Writes the next version of the price book. */
function savePrices(body: SavePrices) {
  return request({ method: 'PUT', path: '/api/staff/prices', body, answer: pricesView });
}

export function useSavePrices() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: savePrices,
    onSuccess: async (prices) => {
      client.setQueryData(pricesQuery().queryKey, prices);
      // What an order costs to make and leaves goes by the book in force.
      await orderChanged(client);
    },
    onError: () => client.invalidateQueries({ queryKey: staffKeys.prices }),
  });
}
