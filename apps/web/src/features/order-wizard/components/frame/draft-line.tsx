import { useSyncExternalStore } from 'react';
import { useWizard } from '../../wizard/wizard-context.ts';

/** "10:42", by this device's clock. */
export function clockTime(ms: number): string {
  return new Date(ms).toLocaleTimeString([], { hour: '2-digit', minute: '2-digit', hour12: false });
}

/** Whether and when the answers were last kept. */
export function DraftLine() {
  const { keeper } = useWizard();
  const { savedAt, refused, other } = useSyncExternalStore(keeper.subscribe, keeper.status);
  if (refused) return <span>This device keeps no draft: don’t close the page</span>;
  if (other !== null) return <span>Not kept just now</span>;
  if (savedAt === null) return <span>Nothing is booked yet</span>;
  return (
    <span>
      Draft kept on this device, <span className="tabular-nums">{clockTime(savedAt)}</span>
    </span>
  );
}
