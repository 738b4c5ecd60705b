import { useEffect, useState } from 'react';

/** The value once it has not changed for a moment: for questions that cost a request. */
export function useRested<T>(value: T, ms = 450): T {
  const [rested, setRested] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setRested(value), ms);
    return () => clearTimeout(timer);
  }, [value, ms]);
  return rested;
}
