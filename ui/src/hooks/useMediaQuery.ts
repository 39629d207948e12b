import { useCallback, useSyncExternalStore } from 'react';

/**
 * Watches a media query.
 *
 * @param query query without the at-rule, such as `(min-width: 1200px)`.
 * @returns true while it matches.
 */
export function useMediaQuery(query: string): boolean {
  const watch = useCallback(
    (onChange: () => void) => {
      const list = window.matchMedia(query);
      list.addEventListener('change', onChange);
      return () => list.removeEventListener('change', onChange);
    },
    [query],
  );
  return useSyncExternalStore(watch, () => window.matchMedia(query).matches);
}
