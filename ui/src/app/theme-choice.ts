import { useSyncExternalStore } from 'react';
import { create } from 'zustand';
import { persist } from 'zustand/middleware';

export type ThemeChoice = 'system' | 'light' | 'dark';

interface ThemeState {
  choice: ThemeChoice;
  choose: (choice: ThemeChoice) => void;
}

/** Which theme this browser shows; kept here because it belongs to the bench, not to the person. */
export const useThemeChoice = create<ThemeState>()(
  persist((set) => ({ choice: 'system', choose: (choice) => set({ choice }) }), {
    name: 'ohmstead-theme',
  }),
);

const DARK = '(prefers-color-scheme: dark)';

function watchSystem(onChange: () => void): () => void {
  const query = window.matchMedia(DARK);
  query.addEventListener('change', onChange);
  return () => query.removeEventListener('change', onChange);
}

/** True when the page is to be shown for a dim bench. */
export function useIsDark(): boolean {
  const choice = useThemeChoice((state) => state.choice);
  const isSystemDark = useSyncExternalStore(watchSystem, () => window.matchMedia(DARK).matches);
  return choice === 'system' ? isSystemDark : choice === 'dark';
}
