import { type QueryClient, useQueryClient } from '@tanstack/react-query';
import { useCallback, useEffect, useRef, useState } from 'react';
import { type CaseReading } from '@/lib/bench/case-reading';
import { placeKey } from '@/lib/bench/places';
import { problemInWords, problemOf } from '@/lib/bench/problem';
import { readingsQuery } from '../api/get-readings';
import { type NewReading, saveReadings } from '../api/save-readings';
import { withdrawReading } from '../api/withdraw-reading';
import { type PendingReading, usePendingReadings } from '../entry/pending-readings';

/** How the way to the service stands. */
export type SendState = 'idle' | 'sending' | 'waiting';

const FIRST_WAIT_MS = 1_500;
const LONGEST_WAIT_MS = 30_000;

/**
 * Sends the pending readings of a case one after the other, and again after a failure of the network.
 *
 * A reading that the service refuses stays pending with its sentence and is not sent again by itself.
 *
 * @returns `sending` while a request runs, `waiting` while the service cannot be reached.
 */
export function useReadingSender(caseId: string): SendState {
  const queryClient = useQueryClient();
  const pending = usePendingReadings((state) => state.pending[caseId]);
  const [state, setState] = useState<SendState>('idle');
  const [round, setRound] = useState(0);
  const isBusy = useRef(false);
  const wait = useRef(FIRST_WAIT_MS);
  const next = useCallback(() => setRound((count) => count + 1), []);

  const waiting = pending?.filter(({ refusal }) => !refusal) ?? [];
  const first = waiting[0];
  useEffect(() => {
    if (!first || isBusy.current) return;
    isBusy.current = true;
    setState('sending');
    const batch = first.withdraws ? [first] : waiting.filter((one) => !one.withdraws);
    let timer: ReturnType<typeof setTimeout> | undefined;
    void sendBatch(queryClient, caseId, batch).then((isReached) => {
      isBusy.current = false;
      if (isReached) {
        wait.current = FIRST_WAIT_MS;
        setState('idle');
        next();
        return;
      }
      setState('waiting');
      timer = setTimeout(next, wait.current);
      wait.current = Math.min(LONGEST_WAIT_MS, wait.current * 2);
    });
    return () => clearTimeout(timer);
    // `waiting` is derived from what `first` and `round` stand for.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [first?.clientId, round, caseId]);

  useEffect(() => {
    window.addEventListener('online', next);
    return () => window.removeEventListener('online', next);
  }, [next]);
  return first ? (state === 'idle' ? 'sending' : state) : 'idle';
}

/** Sends one batch; false when the service was not reached and it should be tried again. */
async function sendBatch(
  queryClient: QueryClient,
  caseId: string,
  batch: readonly PendingReading[],
): Promise<boolean> {
  const { settle, refuse } = usePendingReadings.getState();
  try {
    const [first] = batch;
    if (first.withdraws) {
      await withdrawReading(caseId, first.withdraws);
      updateReadings(queryClient, caseId, [], first.withdraws);
    } else {
      updateReadings(queryClient, caseId, await saveReadings(caseId, batch.map(asSent)));
    }
    settle(
      caseId,
      batch.map(({ clientId }) => clientId),
    );
    void queryClient.invalidateQueries({ queryKey: ['cases', caseId, 'reading-history'] });
    return true;
  } catch (error) {
    const problem = problemOf(error);
    const isWorthRetrying =
      !problem || problem.status >= 500 || [401, 408, 429].includes(problem.status);
    if (isWorthRetrying) return false;
    const first = batch[0];
    if (first.withdraws && problem.status === 404) {
      updateReadings(queryClient, caseId, [], first.withdraws);
      settle(caseId, [first.clientId]);
    } else if (batch.length === 1) {
      refuse(caseId, first.clientId, problemInWords(error));
    } else {
      // One bad value must not hold up the others: each by itself.
      for (const one of batch) {
        if (!(await sendBatch(queryClient, caseId, [one]))) return false;
      }
    }
    return true;
  }
}

function asSent({ clientId, place, value, seen, meterId }: PendingReading): NewReading {
  return { clientId, ...place, value, seen, meterId };
}

/** Puts what was stored into the readings already on the screen. */
function updateReadings(
  queryClient: QueryClient,
  caseId: string,
  stored: readonly CaseReading[],
  withdrawn?: number,
): void {
  const keys = new Set(stored.map(placeKey));
  queryClient.setQueryData(readingsQuery(caseId).queryKey, (old: CaseReading[] | undefined) => [
    ...(old ?? []).filter((reading) => reading.id !== withdrawn && !keys.has(placeKey(reading))),
    ...stored,
  ]);
}
