import { useState } from 'react';

const STORAGE_KEY = 'ohmstead.meter';

/**
 * Remembers which meter readings are taken with, in this browser.
 *
 * @returns the meter's id, undefined for the usual digital one, and the way to choose another.
 */
export function useMeterChoice(): [string | undefined, (id: string | undefined) => void] {
  const [meterId, setMeterId] = useState(() => localStorage.getItem(STORAGE_KEY) ?? undefined);
  const choose = (id: string | undefined) => {
    setMeterId(id);
    if (id) localStorage.setItem(STORAGE_KEY, id);
    else localStorage.removeItem(STORAGE_KEY);
  };
  return [meterId, choose];
}
