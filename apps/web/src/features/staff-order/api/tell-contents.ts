import type { TellContents } from '#shared/contracts/contents.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { sendToOrder, useOrderCommand } from './use-order-command.ts';

type Told = TellContents & { readonly changeId: string };

/** Notes that the customer was told what is in the cake now, otherwise than by our e-mail. */
export function tellContents(number: number, { changeId, ...body }: Told): Promise<StaffOrder> {
  return sendToOrder(number, `contents/${encodeURIComponent(changeId)}/told`, body);
}

export function useTellContents(number: number) {
  return useOrderCommand(number, tellContents);
}
