import { useEffect, useState } from 'react';

/** Milliseconds that a dialog takes to close; its frame must stand until then. */
const CLOSING_MS = 260;

/**
 * Closes a dialog before it is taken off the page. One that is taken off while it is open leaves the page behind it
 * hidden from screen readers and the focus nowhere.
 *
 * @param onClose what happens after it is closed, unless `leave` is told otherwise.
 * @returns whether the dialog is open, and how to leave it; the focus goes back to where it came from.
 */
export function useDialogLeave(onClose: () => void) {
  const [origin] = useState(() => document.activeElement);
  const [after, setAfter] = useState<() => void>();
  useEffect(() => {
    if (!after) return;
    const timer = setTimeout(() => {
      if (origin instanceof HTMLElement && origin.isConnected) origin.focus();
      after();
    }, CLOSING_MS);
    return () => clearTimeout(timer);
  }, [after, origin]);
  const leave = (then: () => void = onClose) => setAfter(() => then);
  return { isOpen: after === undefined, leave };
}
