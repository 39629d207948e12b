import { queryOptions, useQuery } from '@tanstack/react-query';
import { apiClient } from '@/lib/api-client';
import { type CaseReading } from '@/lib/bench/case-reading';

/**
 * Fetches the newest reading per place of a case.
 *
 * @param caseId id of the case.
 * @param signal aborts the request.
 * @returns readings as the service keeps them.
 */
export async function getReadings(caseId: string, signal?: AbortSignal): Promise<CaseReading[]> {
  const { data } = await apiClient.get<CaseReading[]>(`/cases/${caseId}/readings`, { signal });
  return data;
}

/** Query options of a case's readings. */
export function readingsQuery(caseId: string) {
  return queryOptions({
    queryKey: ['cases', caseId, 'readings'],
    queryFn: ({ signal }) => getReadings(caseId, signal),
  });
}

/** Readings of a case, kept up to date by what is entered. */
export function useReadings(caseId: string) {
  return useQuery(readingsQuery(caseId));
}
