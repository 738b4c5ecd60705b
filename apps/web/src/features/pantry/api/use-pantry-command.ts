import { useMutation, useQueryClient } from '@tanstack/react-query';
import { orderChanged, staffKeys } from '#web/lib/staff-keys.ts';

/**
 * Something done to the pantry. What is made of it is asked for again: the pantry itself, what the
 * menu says is in things, and the orders whose allergens may now be others.
 */
export function usePantryCommand<V, A>(send: (variables: V) => Promise<A>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: send,
    onSettled: async () => {
      await client.invalidateQueries({ queryKey: staffKeys.pantry });
      void client.invalidateQueries({ queryKey: ['menu'] });
      void orderChanged(client);
    },
  });
}
