import type { QueryClient } from '@tanstack/react-query';

/** The keys of what the staff see, in one place because one act changes several of them. */
export const staffKeys = {
  orders: ['staff', 'orders'],
  order: (number: number) => ['staff', 'orders', 'one', number],
  calendar: ['staff', 'calendar'],
  mail: ['staff', 'mail'],
  people: ['staff', 'people'],
  prices: ['staff', 'prices'],
  allergyTable: ['staff', 'allergy-table'],
  kitchenRules: ['staff', 'kitchen-rules'],
  pantry: ['staff', 'pantry'],
  eggs: ['staff', 'pantry', 'eggs'],
  shopping: ['staff', 'pantry', 'shopping'],
} as const;

/** After anything done to an order: its page, the list and the calendar are asked for again. */
export async function orderChanged(client: QueryClient): Promise<void> {
  await Promise.all([
    client.invalidateQueries({ queryKey: staffKeys.orders }),
    client.invalidateQueries({ queryKey: staffKeys.calendar }),
    client.invalidateQueries({ queryKey: staffKeys.mail }),
  ]);
}
