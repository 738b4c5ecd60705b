import { useState } from 'react';
import { same } from './same.ts';

/**
 * The same object for as long as it says the same, so that what is worked out of it is not worked
 * out again for an answer that has nothing to do with it.
 */
export function useStable<T>(value: T): T {
  const [stable, setStable] = useState(value);
  if (same(value, stable)) return stable;
  setStable(value);
  return value;
}
