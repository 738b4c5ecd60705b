import { useCallback, useSyncExternalStore } from 'react';

/** From here on there is room for seven days side by side. */
export const roomForWeek = '(min-width: 48rem)';
/** From here on a table reads better than cards. */
export const roomForTable = '(min-width: 52rem)';

/** Whether a media query holds; where there are none (a test), the wide page. */
export function useMedia(query: string): boolean {
  const subscribe = useCallback(
    (changed: () => void) => {
      if (typeof window.matchMedia !== 'function') return () => undefined;
      const list = window.matchMedia(query);
      list.addEventListener('change', changed);
      return () => list.removeEventListener('change', changed);
    },
    [query],
  );
  return useSyncExternalStore(subscribe, () =>
    typeof window.matchMedia === 'function' ? window.matchMedia(query).matches : true,
  );
}
