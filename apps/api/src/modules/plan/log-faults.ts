import type { Fault } from '#shared/dates/plan-fault.ts';
import { currentDatabase } from '#api/db/current-database.ts';

/** A plan the checker refuses is a mistake of ours: it is never shown, and told in the log. */
export function logFaults(faults: readonly Fault[]): void {
  if (faults.length === 0) return;
  currentDatabase().logger.error({ faults: faults.slice(0, 10) }, 'the checker refused a plan');
}
