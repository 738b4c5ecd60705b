import { type KeyboardEvent, useCallback, useRef, useState } from 'react';

type Steps = Readonly<Partial<Record<string, number>>>;

/**
 * One tab stop for a row of things: the arrow keys go from one to the next. `steps` says how far
 * each key goes (a week down is 7). `start` is the stop before anybody has been there.
 */
export function useRoving(count: number, start: number, steps: Steps = alongRow) {
  const items = useRef(new Map<number, HTMLElement>());
  const [moved, setMoved] = useState<number | null>(null);
  const current = Math.max(0, Math.min(count - 1, moved ?? start));

  const onKeyDown = useCallback(
    (event: KeyboardEvent) => {
      const step = steps[event.key];
      const to =
        event.key === 'Home'
          ? 0
          : event.key === 'End'
            ? count - 1
            : step === undefined
              ? null
              : current + step;
      if (to === null || to < 0 || to >= count) return;
      event.preventDefault();
      setMoved(to);
      items.current.get(to)?.focus();
    },
    [count, current, steps],
  );

  /** The props of the item at a place. */
  const itemAt = useCallback(
    (at: number) => ({
      tabIndex: at === current ? 0 : -1,
      onKeyDown,
      onFocus: () => setMoved(at),
      ref: (element: HTMLElement | null) => {
        if (element) items.current.set(at, element);
        else items.current.delete(at);
      },
    }),
    [current, onKeyDown],
  );
  return itemAt;
}

const alongRow: Steps = { ArrowRight: 1, ArrowLeft: -1 };
export const alongWeeks: Steps = { ArrowRight: 1, ArrowLeft: -1, ArrowDown: 7, ArrowUp: -7 };
