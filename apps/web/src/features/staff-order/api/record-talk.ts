import type { RecordTalk, StaffOrder } from '#shared/contracts/staff.ts';
import { sendToOrder, useOrderCommand } from './use-order-command.ts';

/** Records the talk about a stop that no declared allergy stands behind. */
export function recordTalk(number: number, body: RecordTalk): Promise<StaffOrder> {
  return sendToOrder(number, 'talks', body);
}

export function useRecordTalk(number: number) {
  return useOrderCommand(number, recordTalk);
}
