import { type Netlist, type Seen } from '@engine/netlist/types';
import { useCallback, useMemo, useState } from 'react';
import { type CaseReading } from '@/lib/bench/case-reading';
import { type Place, placeKey } from '@/lib/bench/places';
import { checkEntry } from '../entry/check-entry';
import { type PendingReading, usePendingReadings } from '../entry/pending-readings';

/** What one cell shows. */
export interface CellEntry {
  /** Value on its way or stored. */
  value?: number | 'OL';
  seen?: Seen;
  /** Typed and not entered yet. */
  draft?: string;
  /** Why the text or the value was not taken. */
  error?: string;
  /** True while the service does not have it. */
  isPending: boolean;
}

/** Everything the grid and the single-reading view need. */
export interface ReadingEntry {
  entryOf: (place: Place) => CellEntry;
  /** Keeps what is being typed; nothing is checked yet. */
  type: (place: Place, text: string) => void;
  /** Enters what was typed, or the given text. False when it was not taken; the text stays. */
  enter: (place: Place, text?: string) => boolean;
  see: (place: Place, seen: Seen | undefined) => void;
  /** Drops what was typed. */
  revert: (place: Place) => void;
  undo: () => Place | null;
  canUndo: boolean;
}

interface Change {
  place: Place;
  before: Pick<CaseReading, 'value' | 'seen'> | null;
}

const NONE: never[] = [];
const NO_DRAFTS: Record<string, string> = {};

/**
 * Turns typing into readings: drafts while typing, checked when entered, kept until the service has them.
 *
 * @param caseId id of the case.
 * @param netlist circuit with the parts added as found.
 * @param readings readings as the service keeps them.
 * @param meterId meter that new values are taken with.
 */
export function useReadingEntry(
  caseId: string,
  netlist: Netlist,
  readings: readonly CaseReading[],
  meterId: number | undefined,
): ReadingEntry {
  const pending = usePendingReadings((state) => state.pending[caseId] ?? NONE) as PendingReading[];
  const drafts = usePendingReadings((state) => state.drafts[caseId] ?? NO_DRAFTS);
  const { keep, settle, setDraft } = usePendingReadings.getState();
  const [errors, setErrors] = useState<Record<string, string>>({});
  const [changes, setChanges] = useState<Change[]>([]);

  const stored = useMemo(
    () => new Map(readings.map((reading) => [placeKey(reading), reading])),
    [readings],
  );
  const waiting = useMemo(
    () => new Map(pending.map((one) => [placeKey(one.place), one])),
    [pending],
  );
  const currentAt = useCallback(
    (key: string): Change['before'] => {
      const one = waiting.get(key);
      if (one) return one.withdraws ? null : one;
      return stored.get(key) ?? null;
    },
    [waiting, stored],
  );
  const setError = useCallback((key: string, message?: string) => {
    setErrors(({ [key]: _old, ...rest }) => (message ? { ...rest, [key]: message } : rest));
  }, []);

  const put = useCallback(
    (place: Place, next: Change['before']) => {
      const key = placeKey(place);
      const id = stored.get(key)?.id;
      if (next) {
        const { value, seen } = next;
        const clientId = crypto.randomUUID();
        keep(caseId, [{ clientId, place, value, seen, meterId: seen ? undefined : meterId }]);
      } else if (id) {
        keep(caseId, [{ clientId: crypto.randomUUID(), place, withdraws: id }]);
      } else {
        const one = waiting.get(key);
        if (one) settle(caseId, [one.clientId]);
      }
    },
    [caseId, keep, settle, meterId, stored, waiting],
  );
  const change = useCallback(
    (place: Place, next: Change['before']) => {
      const before = currentAt(placeKey(place));
      const isRefused = !!waiting.get(placeKey(place))?.refusal;
      if (!isRefused && before?.value === next?.value && before?.seen === next?.seen) return;
      setChanges((old) => [...old.slice(-49), { place, before }]);
      put(place, next);
    },
    [currentAt, put, waiting],
  );

  return {
    entryOf: (place) => {
      const key = placeKey(place);
      const one = waiting.get(key);
      const current = currentAt(key);
      return {
        value: current?.value,
        seen: current?.seen,
        draft: drafts[key],
        error: errors[key] ?? one?.refusal,
        isPending: !!one,
      };
    },
    type: (place, text) => {
      setDraft(caseId, placeKey(place), text);
      setError(placeKey(place));
    },
    enter: (place, given) => {
      const key = placeKey(place);
      const text = given ?? usePendingReadings.getState().drafts[caseId]?.[key];
      if (text === undefined) {
        // Enter on a value that the service refused sends it once more.
        const one = waiting.get(key);
        if (one?.refusal) put(place, one.withdraws ? null : one);
        return true;
      }
      if (text.trim() === '') {
        change(place, null);
      } else {
        const checked = checkEntry(text, place, netlist);
        if (!checked.ok) {
          setDraft(caseId, key, text);
          setError(key, checked.message);
          return false;
        }
        change(place, { value: checked.value });
      }
      setDraft(caseId, key, undefined);
      setError(key);
      return true;
    },
    see: (place, seen) => change(place, seen ? { seen } : null),
    revert: (place) => {
      const key = placeKey(place);
      const one = waiting.get(key);
      if (one?.refusal) settle(caseId, [one.clientId]);
      setDraft(caseId, key, undefined);
      setError(key);
    },
    undo: () => {
      const last = changes[changes.length - 1];
      if (!last) return null;
      setChanges((old) => old.slice(0, -1));
      put(last.place, last.before);
      return last.place;
    },
    canUndo: changes.length > 0,
  };
}
