import { useEffect, useState } from 'react';

/**
 * Follows a value once it has rested.
 *
 * @param value newest value.
 * @param ms how long it must stay the same, in milliseconds.
 * @returns the value as it was when it last rested; at first the value itself.
 */
export function useSettled<T>(value: T, ms: number): T {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), ms);
    return () => clearTimeout(timer);
  }, [value, ms]);
  return settled;
}
