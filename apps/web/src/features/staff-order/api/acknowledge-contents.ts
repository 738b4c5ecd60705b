import type { AcknowledgeContents } from '#shared/contracts/contents.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { sendToOrder, useOrderCommand } from './use-order-command.ts';

type Acknowledged = AcknowledgeContents & { readonly changeId: string };

/** A baker has seen what is in the cake now, and says what is done about it. */
export function acknowledgeContents(
  number: number,
  { changeId, ...body }: Acknowledged,
): Promise<StaffOrder> {
  return sendToOrder(number, `contents/${encodeURIComponent(changeId)}/acknowledge`, body);
}

export function useAcknowledgeContents(number: number) {
  return useOrderCommand(number, acknowledgeContents);
}
