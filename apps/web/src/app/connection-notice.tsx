import { useSyncExternalStore } from 'react';
import { Notice } from '#web/components/ui/notice.tsx';

function subscribe(changed: () => void): () => void {
  window.addEventListener('online', changed);
  window.addEventListener('offline', changed);
  return () => {
    window.removeEventListener('online', changed);
    window.removeEventListener('offline', changed);
  };
}

/** Says so while the device has no connection, and that nothing is lost. */
export function ConnectionNotice() {
  const online = useSyncExternalStore(subscribe, () => navigator.onLine);
  return (
    <div role="status" data-print="no">
      {!online && (
        <div className="page pt-4">
          <Notice tone="butter" title="You are offline just now">
            <p>What you write is kept on this device. Sending needs the connection back.</p>
          </Notice>
        </div>
      )}
    </div>
  );
}
