import { create } from 'zustand';

interface SignInAgain {
  /** The page asks the person to sign in again. */
  isAsked: boolean;
  /** Asks; requests that come meanwhile wait for the same answer. */
  ask: () => Promise<boolean>;
  /** Ends the wait: true when the same person is back. */
  settle: (isBack: boolean) => void;
}

let waiting: ((isBack: boolean) => void)[] = [];

/** Whether the page waits for somebody to sign in again over what they were doing. */
export const useSignInAgain = create<SignInAgain>()((set) => ({
  isAsked: false,
  ask: () => {
    set({ isAsked: true });
    return new Promise((resolve) => waiting.push(resolve));
  },
  settle: (isBack) => {
    const answered = waiting;
    waiting = [];
    set({ isAsked: false });
    answered.forEach((answer) => answer(isBack));
  },
}));
