import { useState } from 'react';

const STORAGE_KEY = 'ohmstead.meter';

/**
 * Remembers which meter readings are taken with, in this browser.
 *
 * @returns the meter's id, undefined for the usual digital one, and the way to choose another.
 */
export function useMeterChoice(): [number | undefined, (id: number | undefined) => void] {
  const [meterId, setMeterId] = useState(readChoice);
  const choose = (id: number | undefined) => {
    setMeterId(id);
    if (id) localStorage.setItem(STORAGE_KEY, String(id));
    else localStorage.removeItem(STORAGE_KEY);
  };
  return [meterId, choose];
}

function readChoice(): number | undefined {
  const id = Number(localStorage.getItem(STORAGE_KEY));
  return Number.isInteger(id) && id > 0 ? id : undefined;
}
