import { useEffect, useSyncExternalStore } from 'react';
import { create } from 'zustand';
import { persist } from 'zustand/middleware';

export type ThemeChoice = 'system' | 'light' | 'dark';

interface ThemeState {
  /** Whose page it is; empty while nobody is signed in. */
  person: string;
  /** What each person chose in this browser; the empty name holds what was chosen last. */
  choices: Record<string, ThemeChoice>;
  choose: (choice: ThemeChoice) => void;
}

/** Which theme each person sees in this browser; two people share a bench, not their eyes. */
const useThemeState = create<ThemeState>()(
  persist(
    (set) => ({
      person: '',
      choices: {},
      choose: (choice) =>
        set(({ person, choices }) => ({ choices: { ...choices, '': choice, [person]: choice } })),
    }),
    { name: 'ohmstead-theme', partialize: ({ choices }) => ({ choices }) },
  ),
);

function choiceOf({ person, choices }: ThemeState): ThemeChoice {
  return choices[person] ?? choices[''] ?? 'system';
}

/** The theme that the person at the page chose, and how to choose another. */
export function useThemeChoice(): { choice: ThemeChoice; choose: (choice: ThemeChoice) => void } {
  const choice = useThemeState(choiceOf);
  const choose = useThemeState((state) => state.choose);
  return { choice, choose };
}

/** Says whose page it is, so that their own choice holds. */
export function useThemeOf(person: { id: number } | null | undefined): void {
  const name = person ? String(person.id) : '';
  useEffect(() => {
    useThemeState.setState({ person: name });
  }, [name]);
}

const DARK = '(prefers-color-scheme: dark)';

function watchSystem(onChange: () => void): () => void {
  const query = window.matchMedia(DARK);
  query.addEventListener('change', onChange);
  return () => query.removeEventListener('change', onChange);
}

/** True when the page is to be shown for a dim bench. */
export function useIsDark(): boolean {
  const choice = useThemeState(choiceOf);
  const isSystemDark = useSyncExternalStore(watchSystem, () => window.matchMedia(DARK).matches);
  return choice === 'system' ? isSystemDark : choice === 'dark';
}
