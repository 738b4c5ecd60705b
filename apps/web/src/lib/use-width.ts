import { type RefCallback, useCallback, useState } from 'react';

/** The width of an element as it is laid out, in CSS pixels; `start` until it is known. */
export function useWidth<E extends Element>(start: number): [RefCallback<E>, number] {
  const [width, setWidth] = useState(start);
  const ref = useCallback((element: E | null) => {
    if (!element || typeof ResizeObserver !== 'function') return undefined;
    const observer = new ResizeObserver(([entry]) => {
      if (entry) setWidth(entry.contentRect.width);
    });
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [ref, width];
}
