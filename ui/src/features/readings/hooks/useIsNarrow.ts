import { useSyncExternalStore } from 'react';

const QUERY = '(max-width: 640px)';

function watch(onChange: () => void): () => void {
  const list = window.matchMedia?.(QUERY);
  list?.addEventListener('change', onChange);
  return () => list?.removeEventListener('change', onChange);
}

/** True on a screen as wide as a phone. */
export function useIsNarrow(): boolean {
  return useSyncExternalStore(watch, () => window.matchMedia?.(QUERY).matches ?? false);
}
