import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { type DiagnosisResult } from '@engine/diagnosis-types';
import { apiClient } from '@/lib/api-client';
import { type CaseReading, revisionOfReadings } from '@/lib/bench/case-reading';
import { useSettled } from '../hooks/useSettled';

/** A diagnosis as the service stores it. */
export interface Diagnosis {
  id: number;
  /** When it was made, ISO 8601. */
  at: string;
  engineVersion: string;
  ms: number;
  result: DiagnosisResult;
  /** Readings it was made from, in the order that `ReadingEvidence.reading` counts. */
  readingIds: number[];
}

/** How long readings must rest before the diagnosis is asked for again, in ms. */
export const DIAGNOSIS_REST_MS = 350;

/**
 * Runs the diagnosis of a case; the same state gives the stored answer.
 *
 * @param caseId id of the case.
 * @param signal aborts the request when a newer one takes its place.
 * @returns ranked suspects and what to read next.
 */
export async function runDiagnosis(caseId: string, signal?: AbortSignal): Promise<Diagnosis> {
  const { data } = await apiClient.post<Diagnosis>(`/cases/${caseId}/diagnosis`, {}, { signal });
  return data;
}

/** Query options of the diagnosis for one state of the case. */
export function diagnosisQuery(caseId: string, revision: string) {
  return queryOptions({
    queryKey: ['cases', caseId, 'diagnosis', revision],
    queryFn: ({ signal }) => runDiagnosis(caseId, signal),
    placeholderData: keepPreviousData,
    staleTime: Infinity,
    retry: 1,
  });
}

/**
 * Keeps the diagnosis of a case in step with its readings.
 *
 * Any number of panels may call it: they share one request. The newest state wins, the one before stays
 * visible meanwhile (`isPlaceholderData`).
 *
 * @param caseId id of the case.
 * @param readings readings as the service keeps them; none, no diagnosis.
 * @param caseVersion changes when circuit, as found or line voltage do.
 */
export function useDiagnosis(
  caseId: string,
  readings: readonly CaseReading[] | undefined,
  caseVersion?: number,
) {
  const revision = `${caseVersion ?? ''}:${revisionOfReadings(readings ?? [])}`;
  const settled = useSettled(revision, DIAGNOSIS_REST_MS);
  const query = useQuery({
    ...diagnosisQuery(caseId, settled),
    // Only the state that has come to rest is asked about, never one that is already past.
    enabled: (readings?.length ?? 0) > 0 && settled === revision,
  });
  return { ...query, isCatchingUp: query.isPlaceholderData || settled !== revision };
}
