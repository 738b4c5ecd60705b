import type { OrderForm } from '../../draft/empty-order.ts';

/** The ways to be reached, as they are read. */
export const reachWords: Readonly<Record<OrderForm['you']['reachBy'], string>> = {
  email: 'E-mail',
  phone: 'Telephone',
  text: 'Text message',
};
