import { useState } from 'react';

/**
 * The same object for as long as it says the same, so that what is worked out of it is not worked
 * out again for an answer that has nothing to do with it.
 */
export function useStable<T>(value: T): T {
  const [stable, setStable] = useState({ value, text: JSON.stringify(value) });
  const text = JSON.stringify(value);
  if (text === stable.text) return stable.value;
  setStable({ value, text });
  return value;
}
