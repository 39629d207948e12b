import { type Seen } from '@engine/netlist/types';
import { create } from 'zustand';
import { createJSONStorage, persist } from 'zustand/middleware';
import { type Place, placeKey } from '@/lib/bench/places';

/** A reading that the service does not have yet, or a reading to be taken back. */
export interface PendingReading {
  /** Made where it was typed; sending it twice stores it once. */
  clientId: string;
  place: Place;
  value?: number | 'OL';
  seen?: Seen;
  meterId?: number;
  /** Id of the stored reading to take back instead of storing one. */
  withdraws?: number;
  /** Sentence of the service when it refused this one; it is not sent again by itself. */
  refusal?: string;
}

interface PendingState {
  /** By case, oldest first, at most one per place. */
  pending: Record<string, PendingReading[]>;
  /** By case and place: typed but not entered yet. */
  drafts: Record<string, Record<string, string>>;
  keep: (caseId: string, readings: readonly PendingReading[]) => void;
  settle: (caseId: string, clientIds: readonly string[]) => void;
  refuse: (caseId: string, clientId: string, refusal: string) => void;
  setDraft: (caseId: string, key: string, text: string | undefined) => void;
}

const STORAGE_KEY = 'ohmstead.readings';

/**
 * Readings on their way to the service, kept in the browser so that a reload or a lost network loses none.
 */
export const usePendingReadings = create<PendingState>()(
  persist(
    (set) => ({
      pending: {},
      drafts: {},
      keep: (caseId, readings) =>
        set(({ pending }) => {
          const keys = new Set(readings.map(({ place }) => placeKey(place)));
          const others = (pending[caseId] ?? []).filter(({ place }) => !keys.has(placeKey(place)));
          return { pending: { ...pending, [caseId]: [...others, ...readings] } };
        }),
      settle: (caseId, clientIds) =>
        set(({ pending }) => {
          const rest = (pending[caseId] ?? []).filter((one) => !clientIds.includes(one.clientId));
          return { pending: withEntry(pending, caseId, rest.length > 0 ? rest : undefined) };
        }),
      refuse: (caseId, clientId, refusal) =>
        set(({ pending }) => ({
          pending: {
            ...pending,
            [caseId]: (pending[caseId] ?? []).map((one) =>
              one.clientId === clientId ? { ...one, refusal } : one,
            ),
          },
        })),
      setDraft: (caseId, key, text) =>
        set(({ drafts }) => {
          const own = withEntry(drafts[caseId] ?? {}, key, text);
          return {
            drafts: withEntry(drafts, caseId, Object.keys(own).length > 0 ? own : undefined),
          };
        }),
    }),
    {
      name: STORAGE_KEY,
      version: 1,
      storage: createJSONStorage(() => localStorage),
      partialize: ({ pending, drafts }) => ({ pending, drafts }),
    },
  ),
);

// Another tab writes the same store: read it anew, or this tab would later write over it.
if (typeof window !== 'undefined') {
  window.addEventListener('storage', (event) => {
    if (event.key === STORAGE_KEY) void usePendingReadings.persist.rehydrate();
  });
}

function withEntry<V>(record: Record<string, V>, key: string, value: V | undefined) {
  const { [key]: _old, ...rest } = record;
  return value === undefined ? rest : { ...rest, [key]: value };
}
