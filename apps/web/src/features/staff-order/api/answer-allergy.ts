import type { AnswerAllergy, StaffOrder } from '#shared/contracts/staff.ts';
import { sendToOrder, useOrderCommand } from './use-order-command.ts';

type Answered = AnswerAllergy & { readonly allergyId: string };

/** Records what was said and settled with the guest; what the cake contains stays as it is. */
export function answerAllergy(
  number: number,
  { allergyId, ...body }: Answered,
): Promise<StaffOrder> {
  return sendToOrder(number, `allergies/${encodeURIComponent(allergyId)}/answer`, body);
}

export function useAnswerAllergy(number: number) {
  return useOrderCommand(number, answerAllergy);
}
